import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { startColorMode } from './app/color-mode';
import { chooseFirstPage } from './app/first-page';
import { Providers } from './app/providers';
import { makeQueryClient } from './app/query-client';
import { makeRouter, publicTree } from './app/router';

function show(): void {
  createRoot(document.getElementById('root')!).render(
    <StrictMode>
      <Providers client={client}>
        <RouterProvider router={makeRouter()} />
      </Providers>
    </StrictMode>,
  );
}

const client = makeQueryClient();
startColorMode();
void chooseFirstPage(client, publicTree).then(show);
