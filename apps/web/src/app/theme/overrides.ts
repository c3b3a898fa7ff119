import { defineRecipe, defineSlotRecipe } from '@chakra-ui/react/styled-system';

export const field = { bg: 'bg.panel', borderColor: 'border.control' };
const comfortable = { textStyle: 'md', '--input-height': 'sizes.11' };

/** Where the house differs: targets of 44 px, seen edges on controls, 16 px writing in fields. */
export const recipeOverrides = {
  button: defineRecipe({
    base: { fontWeight: 'semibold', borderRadius: 'l2' },
    variants: {
      size: {
        sm: { h: '9', textStyle: 'sm' },
        md: { h: '11', minW: '11', textStyle: 'md', px: '5' },
        lg: { h: '14', px: '6' },
      },
      variant: { outline: { bg: 'bg.panel' } },
    },
  }),
  heading: defineRecipe({ base: { letterSpacing: '-0.01em', textWrap: 'balance' } }),
  input: defineRecipe({ variants: { variant: { outline: field }, size: { md: comfortable } } }),
  link: defineRecipe({
    defaultVariants: { variant: 'underline' },
    variants: {
      variant: {
        underline: {
          textDecorationColor: 'currentColor/50',
          _hover: { textDecorationColor: 'currentColor' },
        },
      },
    },
  }),
  skeleton: defineRecipe({ base: { _motionReduce: { animation: 'none' } } }),
};

export const slotRecipeOverrides = {
  field: defineSlotRecipe({
    slots: [],
    base: {
      label: { textStyle: 'md', fontWeight: 'semibold' },
      helperText: { textStyle: 'sm' },
      errorText: { textStyle: 'sm', fontWeight: 'semibold' },
      requiredIndicator: { color: 'fg.muted' },
    },
  }),
};
