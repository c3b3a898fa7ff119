import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  { path: 'how', lazy: async () => ({ Component: (await import('./how')).How }) },
];
