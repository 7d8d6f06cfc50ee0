import { createSystem, defaultBaseConfig, defineConfig } from '@chakra-ui/react';
import { globalCss } from './global-css';
import { semanticTokens, tokens } from './tokens';

/**
 * Our own system upon the bare base: no default tokens and no default recipes, so that a page loads only what it
 * shows. Components bring their own recipes with `chakra(element, recipe)`.
 */
export const system = createSystem(
  defaultBaseConfig,
  defineConfig({
    cssVarsPrefix: 'lf',
    preflight: true,
    globalCss,
    theme: {
      breakpoints: { sm: '30rem', md: '48rem', lg: '64rem', xl: '80rem' },
      tokens,
      semanticTokens,
      keyframes: { breathe: { '0%, 100%': { opacity: '1' }, '50%': { opacity: '0.45' } } },
    },
  }),
);
