import { chakra } from '@chakra-ui/react';

/** Running text with its headings and lists, at a width that reads well. */
export const Prose = chakra('div', {
  base: {
    maxWidth: 'line',
    '& h2': {
      fontSize: 'xl',
      fontWeight: 'heavy',
      lineHeight: 'heading',
      marginBottom: '2',
    },
    '& > * + h2': { marginTop: '10' },
    '& p + p, & ul + p, & ol + p': { marginTop: '3' },
    '& table + p': { marginTop: '4' },
    '& ul': { listStyleType: 'disc', paddingLeft: '5', marginTop: '2' },
    '& ol': { listStyleType: 'decimal', paddingLeft: '5', marginTop: '2' },
    '& li': { paddingBlock: '0.5', paddingLeft: '1' },
    '& li::marker': { color: 'slate' },
  },
});

/** A table in running text: hairlines, the first column names the row, figures on the right. */
export const FigureTable = chakra('table', {
  base: {
    width: 'full',
    maxWidth: 'line',
    marginTop: '4',
    borderBottomWidth: '1px',
    borderColor: 'hair',
    '& caption': { textAlign: 'left', fontWeight: 'bold', paddingBottom: '2' },
    '& th, & td': { paddingBlock: '2', verticalAlign: 'top', lineHeight: 'heading' },
    '& thead th': { color: 'slate', fontSize: 'sm', fontWeight: 'bold', verticalAlign: 'bottom' },
    '& tbody th, & tbody td': { borderTopWidth: '1px', borderColor: 'hair' },
    '& th': { textAlign: 'left', fontWeight: 'medium', paddingRight: '4' },
    '& td': { paddingRight: '4', _last: { paddingRight: '0' } },
    '& .figure': {
      textAlign: 'right',
      fontWeight: 'bold',
      whiteSpace: 'nowrap',
      paddingLeft: '3',
      paddingRight: '0',
    },
    '& thead .figure': { whiteSpace: 'normal' },
  },
});
