import { chakra } from '@chakra-ui/react';

/** Read out, not shown. */
export const VisuallyHidden = chakra('span', {
  base: {
    position: 'absolute',
    width: '1px',
    height: '1px',
    margin: '-1px',
    overflow: 'hidden',
    clipPath: 'inset(50%)',
    whiteSpace: 'nowrap',
  },
});
