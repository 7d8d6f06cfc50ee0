import { chakra } from '@chakra-ui/react';

/** The frame of every page: one strong left edge, the same at every width. */
export const Page = chakra('div', {
  base: {
    width: 'full',
    marginInline: 'auto',
    paddingInline: { base: '4', sm: '6', lg: '10' },
    paddingBlock: { base: '6', md: '10' },
  },
  variants: {
    width: {
      page: { maxWidth: 'page' },
      text: { maxWidth: 'page', '& > *': { maxWidth: 'line' } },
      form: { maxWidth: 'page', '& > *': { maxWidth: 'form' } },
    },
  },
  defaultVariants: { width: 'page' },
});
