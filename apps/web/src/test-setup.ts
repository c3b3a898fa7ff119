import { cleanup } from '@testing-library/react';
import { afterEach } from 'vitest';

afterEach(cleanup);

/** What jsdom lacks and Chakra asks for. */
window.matchMedia ??= (query) =>
  Object.assign(new EventTarget(), {
    matches: false,
    media: query,
    onchange: null,
    addListener: () => undefined,
    removeListener: () => undefined,
  });
window.ResizeObserver ??= class {
  observe() {}
  unobserve() {}
  disconnect() {}
};
