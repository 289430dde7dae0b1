import { createSystem, defaultBaseConfig, defineConfig } from '@chakra-ui/react';
import { globalCss } from './global-css';
import { semanticTokens, tokens } from './tokens';

/** Chakra with our tokens and only the recipes that we use; our own recipes stand beside their components. */
export const system = createSystem(
  defaultBaseConfig,
  defineConfig({
    preflight: true,
    globalCss,
    theme: {
      breakpoints: { sm: '480px', md: '768px', lg: '1024px', xl: '1280px' },
      keyframes: {
        breathe: { '50%': { opacity: '0.45' } },
        arrive: { from: { opacity: '0', transform: 'translateY(8px)' } },
      },
      tokens,
      semanticTokens,
    },
  }),
);
