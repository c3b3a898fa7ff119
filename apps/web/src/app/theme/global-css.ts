import { defineGlobalStyles } from '@chakra-ui/react/styled-system';

/** Ground, writing, figures, rings, stillness where asked for, and paper. */
export const globalCss = defineGlobalStyles({
  html: {
    bg: 'bg',
    color: 'fg',
    lineHeight: '1.5',
    colorPalette: 'steel',
    colorScheme: 'light',
    scrollPaddingTop: '4rem',
    scrollPaddingBottom: { base: '6rem', md: '2rem' },
  },
  // A field that is wrong is scrolled clear of the bar that saves, with the sentence below it.
  'input, select, textarea': { scrollMarginBlock: '8rem' },
  'html.dark': { colorScheme: 'dark' },
  body: { fontFamily: 'body', fontSize: 'md', minHeight: '100dvh', textRendering: 'optimizeLegibility' },
  '*': { '--global-color-border': 'colors.border' },
  '*::placeholder': { color: 'fg.subtle' },
  '*::selection': { bg: 'steel.muted', color: 'fg' },
  'h1, h2, h3': { textWrap: 'balance' },
  'table, time, output, svg text': { fontVariantNumeric: 'lining-nums tabular-nums' },
  ':focus-visible': { outline: '3px solid', outlineColor: 'steel.solid', outlineOffset: '2px' },
  '*, *::before, *::after': {
    _motionReduce: {
      animationDuration: '0.01ms !important',
      animationIterationCount: '1 !important',
      transitionDuration: '0.01ms !important',
      scrollBehavior: 'auto !important',
    },
  },
  '@page': { margin: '15mm' },
  'html, body': { _print: { background: 'white !important', color: 'black !important', fontSize: '11pt' } },
  'nav, .no-print, [data-scope=toast]': { _print: { display: 'none !important' } },
  svg: { _print: { printColorAdjust: 'exact' } },
  'tr, article, figure': { _print: { breakInside: 'avoid' } },
});
