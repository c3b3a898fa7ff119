import type { ColorMode } from './color-mode';

export const colorModeWords: Record<ColorMode, string> = {
  light: 'Light',
  dark: 'Dark',
  system: 'As the device',
};
