import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  { path: 'chains/new', lazy: async () => ({ Component: (await import('./new-chain')).NewChain }) },
  { path: 'chains/:id', lazy: async () => ({ Component: (await import('./chain-page')).ChainPage }) },
  { path: 'chains/:id/edit', lazy: async () => ({ Component: (await import('./edit-chain')).EditChain }) },
];
