import { render } from '@testing-library/react';
import type { ReactElement } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { Providers } from './app/providers';
import { makeQueryClient } from './app/query-client';

/** Renders as on a page, with look, data and addresses. */
export const renderOnPage = (element: ReactElement) =>
  render(
    <Providers client={makeQueryClient()}>
      <MemoryRouter>{element}</MemoryRouter>
    </Providers>,
  );
