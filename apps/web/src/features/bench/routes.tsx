import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = [
  ...forRoles(
    ['mechanic', 'owner'],
    [
      { path: 'bench', lazy: async () => ({ Component: (await import('./bench')).Bench }) },
      {
        path: 'bench/chains/:id',
        lazy: async () => ({ Component: (await import('./bench-chain')).BenchChain }),
      },
    ],
  ),
];
