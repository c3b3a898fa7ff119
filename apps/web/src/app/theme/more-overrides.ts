import { defineRecipe, defineSlotRecipe } from '@chakra-ui/react/styled-system';
import { field } from './overrides';

/** Where the house differs, in the parts of the pages behind the sign-in. */
export const moreRecipeOverrides = {
  textarea: defineRecipe({ variants: { variant: { outline: field }, size: { md: { textStyle: 'md' } } } }),
};

export const moreSlotOverrides = {
  nativeSelect: defineSlotRecipe({
    slots: [],
    variants: { variant: { outline: { field } }, size: { md: { field: { textStyle: 'md', h: '11' } } } },
  }),
  dialog: defineSlotRecipe({
    slots: [],
    base: { backdrop: { bg: 'rgba(20, 21, 23, 0.55)' }, content: { textStyle: 'md' } },
  }),
  menu: defineSlotRecipe({
    slots: [],
    variants: { size: { md: { content: { minW: '15rem' }, item: { textStyle: 'md', py: '2.5', px: '3' } } } },
  }),
  table: defineSlotRecipe({
    slots: [],
    variants: {
      variant: { line: { row: { bg: 'transparent' }, columnHeader: { color: 'fg.muted', textStyle: 'sm' } } },
      size: { md: { root: { textStyle: 'md' } } },
    },
  }),
  toast: defineSlotRecipe({
    slots: [],
    base: {
      root: {
        borderWidth: '1px',
        borderColor: 'border.emphasized',
        borderInlineStartWidth: '6px',
        borderInlineStartColor: 'steel.solid',
        '&[data-type]': {
          bg: 'bg.panel',
          color: 'fg',
          '--toast-trigger-bg': 'colors.bg.muted',
          '--toast-border-color': 'colors.border.control',
        },
        '&[data-type=error]': { borderInlineStartColor: 'fg.error' },
      },
      title: { textStyle: 'md', fontWeight: 'semibold' },
      description: { opacity: 1, color: 'fg.muted' },
    },
  }),
};
