import { beforeEach, describe, expect, it, vi } from 'vitest';
import { colorMode, setColorMode, startColorMode } from './color-mode';

const look = () => document.documentElement.className;

/** A device whose wish can change. */
function device(isDark: boolean) {
  const wish = Object.assign(new EventTarget(), { matches: isDark });
  vi.spyOn(window, 'matchMedia').mockReturnValue(wish as unknown as MediaQueryList);
  return (next: boolean) => {
    wish.matches = next;
    wish.dispatchEvent(new Event('change'));
  };
}

beforeEach(() => {
  localStorage.clear();
  vi.restoreAllMocks();
});

describe('the look', () => {
  it('follows the device until something is chosen', () => {
    const change = device(true);
    startColorMode();
    expect([colorMode(), look()]).toEqual(['system', 'dark']);
    change(false);
    expect(look()).toBe('light');
  });

  it('keeps what was chosen, whatever the device does', () => {
    const change = device(false);
    startColorMode();
    setColorMode('dark');
    change(false);
    expect([colorMode(), look()]).toEqual(['dark', 'dark']);
    setColorMode('system');
    expect(look()).toBe('light');
  });

  it('takes nonsense in the store for no choice', () => {
    device(false);
    localStorage.setItem('halfpitch-look', 'purple');
    expect(colorMode()).toBe('system');
  });
});
