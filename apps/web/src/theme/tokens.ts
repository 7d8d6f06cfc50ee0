import { defineSemanticTokens, defineTokens } from '@chakra-ui/react';
import { palette } from './palette';

const values = <T extends Record<string, string>>(all: T) =>
  Object.fromEntries(Object.entries(all).map(([name, value]) => [name, { value }])) as {
    [K in keyof T]: { value: string };
  };

/** A 4 px grid in rem, so that it grows with the reader's own text size. */
const grid = {
  '0': '0rem',
  '0.5': '0.125rem',
  '1': '0.25rem',
  '2': '0.5rem',
  '3': '0.75rem',
  '4': '1rem',
  '5': '1.25rem',
  '6': '1.5rem',
  '8': '2rem',
  '10': '2.5rem',
  '12': '3rem',
  '16': '4rem',
  '20': '5rem',
  '24': '6rem',
};

export const tokens = defineTokens({
  fonts: values({
    body: "'Nunito Variable', 'Nunito Fallback', ui-sans-serif, system-ui, sans-serif",
    heading: "'Nunito Variable', 'Nunito Fallback', ui-sans-serif, system-ui, sans-serif",
    mono: 'ui-monospace, Menlo, Consolas, monospace',
  }),
  // 14, 16, 18, 22, 28, 36 px
  fontSizes: values({
    sm: '0.875rem',
    md: '1rem',
    lg: '1.125rem',
    xl: '1.375rem',
    '2xl': '1.75rem',
    '3xl': '2.25rem',
  }),
  fontWeights: values({ normal: '400', medium: '600', bold: '700', heavy: '800' }),
  lineHeights: values({ text: '1.5', heading: '1.2' }),
  spacing: values(grid),
  sizes: values({ ...grid, full: '100%', target: '2.75rem', line: '65ch', page: '75rem', form: '36rem' }),
  radii: values({ control: '6px', card: '10px', round: '999px' }),
  shadows: values({ float: '0 8px 28px rgb(10 20 26 / 0.22)' }),
  zIndex: values({ header: '10', notice: '20', skip: '30' }),
  durations: values({ quick: '150ms', calm: '220ms' }),
});

export const semanticTokens = defineSemanticTokens({
  colors: Object.fromEntries(
    Object.entries(palette).map(([name, { light, dark }]) => [name, { value: { base: light, _dark: dark } }]),
  ),
});
