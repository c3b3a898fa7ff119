import { useSyncExternalStore } from 'react';

export const colorModes = ['light', 'dark', 'system'] as const;
export type ColorMode = (typeof colorModes)[number];

const KEY = 'halfpitch-look';
const listeners = new Set<() => void>();
const darkSystem = () => window.matchMedia('(prefers-color-scheme: dark)');

/** The look chosen on this device; 'system' follows the device. */
export function colorMode(): ColorMode {
  const kept = localStorage.getItem(KEY);
  return colorModes.find((mode) => mode === kept) ?? 'system';
}

function apply(): void {
  const mode = colorMode();
  const isDark = mode === 'dark' || (mode === 'system' && darkSystem().matches);
  document.documentElement.classList.toggle('dark', isDark);
  document.documentElement.classList.toggle('light', !isDark);
}

/** Shows the chosen look, and follows the device while 'system' is chosen. */
export function startColorMode(): void {
  apply();
  darkSystem().addEventListener('change', apply);
}

export function setColorMode(mode: ColorMode): void {
  localStorage.setItem(KEY, mode);
  apply();
  listeners.forEach((listener) => listener());
}

const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

export const useColorMode = () => useSyncExternalStore(subscribe, colorMode);
