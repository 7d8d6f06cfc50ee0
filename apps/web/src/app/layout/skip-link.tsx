import { chakra } from '@chakra-ui/react';

const Anchor = chakra('a', {
  base: {
    position: 'absolute',
    insetInlineStart: '4',
    top: '2',
    zIndex: 'skip',
    bg: 'ink',
    color: 'chalk',
    fontWeight: 'bold',
    paddingBlock: '3',
    paddingInline: '5',
    borderRadius: 'control',
    transform: 'translateY(-200%)',
    _focus: { transform: 'none' },
  },
});

export const SkipLink = () => <Anchor href="#main">Skip to the page</Anchor>;
