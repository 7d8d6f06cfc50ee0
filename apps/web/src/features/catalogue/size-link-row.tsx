import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

/** A size on the common scale, the whole row a link; the columns are the list's own. */
export const SizeLinkRow = chakra(Link, {
  base: {
    display: 'grid',
    columnGap: '6',
    rowGap: '1',
    alignItems: 'center',
    minHeight: 'target',
    paddingBlock: '2',
    borderTopWidth: '1px',
    borderColor: 'hair',
    color: 'ink',
    fontVariantNumeric: 'tabular-nums',
    lineHeight: 'heading',
    '& b': { textDecorationLine: 'underline', textDecorationColor: 'var(--lf-colors-rule)' },
    _hover: { bg: 'wash', '& b': { textDecorationColor: 'var(--lf-colors-bracken)' } },
  },
});
