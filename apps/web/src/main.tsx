import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { startColorMode } from './app/color-mode';
import { Providers } from './app/providers';
import { makeQueryClient } from './app/query-client';
import { makeRouter } from './app/router';

startColorMode();
createRoot(document.getElementById('root')!).render(
  <StrictMode>
    <Providers client={makeQueryClient()}>
      <RouterProvider router={makeRouter()} />
    </Providers>
  </StrictMode>,
);
