import type { RouteObject } from 'react-router-dom';

export const publicRoutes: RouteObject[] = [
  {
    lazy: async () => ({ Component: (await import('./entrance')).Entrance }),
    children: [
      { path: 'sign-in', lazy: async () => ({ Component: (await import('./sign-in')).SignIn }) },
      { path: 'register', lazy: async () => ({ Component: (await import('./register')).Register }) },
      { path: 'forgot', lazy: async () => ({ Component: (await import('./forgot')).Forgot }) },
      { path: 'reset/:token', lazy: async () => ({ Component: (await import('./reset')).Reset }) },
      {
        path: 'invitation/:token',
        lazy: async () => ({ Component: (await import('./invitation')).Invitation }),
      },
    ],
  },
];

export const routes: RouteObject[] = [
  { path: 'account', lazy: async () => ({ Component: (await import('./account')).Account }) },
  { path: 'account/tokens', lazy: async () => ({ Component: (await import('./tokens')).Tokens }) },
];
