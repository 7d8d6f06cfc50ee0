import { defineGlobalStyles } from '@chakra-ui/react';
import { palette } from './palette';

/**
 * In forced colours the reader's own palette wins, in the drawings too, which browsers leave alone. Important,
 * because the layer of the tokens stands above the one of the global styles.
 */
const forced: Record<`--lf-colors-${string}`, string> = Object.fromEntries(
  Object.keys(palette).map((name) => {
    const ground = /^(chalk|paper|wash|onBracken|.*Tint)$/.test(name);
    const link = /^(tarn|bracken)(Deep)?$/.test(name);
    const system = ground ? 'Canvas' : link ? 'LinkText' : 'CanvasText';
    return [`--lf-colors-${hyphened(name)}`, `${system} !important`];
  }),
);

function hyphened(name: string): string {
  return name.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
}

export const globalCss = defineGlobalStyles({
  '*': { '--global-font-body': 'fonts.body', '--global-color-border': 'colors.hair' },
  html: {
    bg: 'chalk',
    color: 'ink',
    colorScheme: 'light',
    fontFamily: 'body',
    fontSize: '100%',
    lineHeight: 'text',
    scrollPaddingTop: '5rem',
  },
  'html.dark': { colorScheme: 'dark' },
  body: { fontSize: 'md', minHeight: '100dvh' },
  '#root': { minHeight: '100dvh', display: 'flex', flexDirection: 'column' },
  ':focus-visible': {
    outline: '3px solid',
    outlineColor: 'tarn',
    outlineOffset: '2px',
    borderRadius: 'control',
  },
  'h1:focus': { outline: 'none' },
  '::selection': { bg: 'tarn', color: 'paper' },
  '::placeholder': { color: 'slate' },
  'table, .figures': { fontVariantNumeric: 'tabular-nums lining-nums' },
  '*, *::before, *::after': {
    '@media (prefers-reduced-motion: reduce)': {
      animationDuration: '0.01ms !important',
      animationIterationCount: '1 !important',
      transitionDuration: '0.01ms !important',
      scrollBehavior: 'auto !important',
    },
  },
  ':root, .dark': { '@media (forced-colors: active)': forced },
});
