import { roles } from '@halfpitch/contracts';
import type { Role, Session } from '@halfpitch/contracts';
import { render, screen, within } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Providers } from '../providers';
import { makeQueryClient } from '../query-client';
import { forRoles } from '../require-role';
import { homeOf, navItems } from './nav-items';
import { Component as SignedIn } from './signed-in';

const id = (n: number) => `0192d6f0-0000-7000-8000-00000000000${n}`;
const sessionOf = (role: Role): Session => ({
  account: { id: id(1), name: 'Ina Quell', email: 'ina@lowweir.example' },
  workshop: {
    id: id(2),
    name: 'Low Weir',
    town: 'Aldermouth',
    timeZone: 'UTC',
    currency: 'GBP',
    today: '2026-03-02',
  },
  role,
  riderId: null,
  preferences: { distanceUnit: 'km' },
  workshops: [{ id: id(2), name: 'Low Weir', role }],
});

const problem = { type: 'about:blank', title: 'Not signed in', status: 401, detail: 'Sign in.' };
const places = [...new Set(roles.flatMap((role) => navItems[role].map(({ to }) => to)))];

function open(role: Role | null, at: string) {
  const answer = () =>
    new Response(JSON.stringify(role ? sessionOf(role) : problem), { status: role ? 200 : 401 });
  vi.stubGlobal('fetch', () => Promise.resolve(answer()));
  vi.stubGlobal('scrollTo', () => undefined);
  const pages = places.map((path) => ({ path, element: <h1>{`page ${path}`}</h1> }));
  const owners = forRoles(['owner'], [{ path: '/secret', element: <h1>for owners</h1> }]);
  const router = createMemoryRouter(
    [
      { path: '/sign-in', element: <h1>sign-in</h1> },
      { Component: SignedIn, children: [...pages, ...owners] },
    ],
    { initialEntries: [at] },
  );
  render(
    <Providers client={makeQueryClient()}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return router;
}

afterEach(() => vi.unstubAllGlobals());

describe('the shell', () => {
  it.each(roles)('takes a %s to their start page and offers their places only', async (role) => {
    open(role, '/');
    await screen.findByRole('heading', { name: `page ${homeOf(role)}` });
    const nav = within(screen.getByRole('navigation', { name: 'Main' }));
    for (const { label } of navItems[role]) expect(nav.getAllByText(label).length).toBeGreaterThan(0);
    const foreign = roles
      .flatMap((other) => navItems[other])
      .filter(({ to }) => !navItems[role].some((own) => own.to === to));
    for (const { label } of foreign) expect(nav.queryByText(label)).toBeNull();
    expect(screen.getByRole('link', { name: 'Skip to the page' }).getAttribute('href')).toBe('#main');
    expect(document.querySelector('main#main')).not.toBeNull();
  });

  it('sends who is not signed in to the sign-in, and keeps where they were going', async () => {
    const router = open(null, '/riders?page=2');
    await screen.findByRole('heading', { name: 'sign-in' });
    expect(router.state.location.search).toBe(`?to=${encodeURIComponent('/riders?page=2')}`);
  });

  it('keeps a page from roles it is not for', async () => {
    open('desk', '/secret');
    await screen.findByRole('heading', { name: 'This page is not for your role' });
    expect(screen.queryByText('for owners')).toBeNull();
  });
});
