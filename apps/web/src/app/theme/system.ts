import { defaultBaseConfig } from '@chakra-ui/react/preset-base';
import { createSystem, defineConfig } from '@chakra-ui/react/styled-system';
import {
  animationStyles,
  breakpoints,
  keyframes,
  layerStyles,
  textStyles,
  tokens,
} from '@chakra-ui/react/theme';
import { globalCss } from './global-css';
import { recipeOverrides, slotRecipeOverrides } from './overrides';
import { recipes, slotRecipes } from './parts';
import { semanticColors } from './tokens';

const fontStack = { value: "'Source Sans 3', 'Source Sans Pro', system-ui, sans-serif" };
const shadow = (value: string, inDark: string) => ({ value: { base: value, _dark: inDark } });

/** Chakra's measures with our colours: its own palette fails WCAG's contrast, so none of it is taken over. */
const parts = defineConfig({
  preflight: true,
  cssVarsPrefix: 'hp',
  cssVarsRoot: ':where(html)',
  globalCss,
  theme: {
    breakpoints,
    keyframes,
    animationStyles,
    layerStyles,
    textStyles,
    tokens: {
      ...tokens,
      colors: {
        transparent: { value: 'transparent' },
        current: { value: 'currentColor' },
        white: { value: '#FFFFFF' },
      },
      fonts: { body: fontStack, heading: fontStack, mono: { value: 'ui-monospace, monospace' } },
    },
    semanticTokens: {
      colors: semanticColors,
      radii: { l1: { value: '3px' }, l2: { value: '6px' }, l3: { value: '10px' } },
      shadows: {
        sm: shadow('0 1px 2px rgba(60, 50, 30, 0.12)', '0 1px 2px rgba(0, 0, 0, 0.5)'),
        md: shadow('0 2px 8px rgba(60, 50, 30, 0.12)', '0 2px 8px rgba(0, 0, 0, 0.5)'),
        lg: shadow('0 8px 24px rgba(60, 50, 30, 0.18)', '0 8px 24px rgba(0, 0, 0, 0.6)'),
        xl: shadow('0 16px 32px rgba(60, 50, 30, 0.2)', '0 16px 32px rgba(0, 0, 0, 0.65)'),
      },
    },
    recipes,
    slotRecipes,
  },
});

export const baseConfigs = [
  defaultBaseConfig,
  parts,
  defineConfig({ theme: { recipes: recipeOverrides, slotRecipes: slotRecipeOverrides } }),
];

/** For the first page; pages behind the sign-in have more parts. */
export const system = createSystem(...baseConfigs);
