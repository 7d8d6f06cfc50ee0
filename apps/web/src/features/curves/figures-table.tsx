import { chakra } from '@chakra-ui/react';

const Head = chakra('th', {
  base: {
    fontWeight: 'medium',
    color: 'slate',
    textAlign: 'right',
    paddingBlock: '2',
    paddingLeft: '3',
    verticalAlign: 'bottom',
    lineHeight: 'heading',
    _first: { textAlign: 'left', paddingLeft: '0' },
  },
});
const Cell = chakra('td', {
  base: {
    textAlign: 'right',
    paddingBlock: '1',
    paddingLeft: '3',
    borderTopWidth: '1px',
    borderColor: 'hair',
  },
});
const Row = chakra('th', {
  base: {
    textAlign: 'left',
    fontWeight: 'normal',
    paddingBlock: '1',
    borderTopWidth: '1px',
    borderColor: 'hair',
  },
});

export interface FiguresTableProps {
  caption: string;
  heads: readonly string[];
  /** The first of each is its name. */
  rows: readonly (readonly string[])[];
}

/** Figures under their heads, right-aligned so that they can be compared down the column. */
export const FiguresTable = ({ caption, heads, rows }: FiguresTableProps) => (
  <chakra.table width="full" fontSize="sm" borderBottomWidth="1px" borderColor="hair">
    <chakra.caption textAlign="left" fontWeight="bold" paddingBottom="1">
      {caption}
    </chakra.caption>
    <thead>
      <tr>
        {heads.map((head) => (
          <Head key={head} scope="col">
            {head}
          </Head>
        ))}
      </tr>
    </thead>
    <tbody>
      {rows.map(([name, ...cells]) => (
        <tr key={name}>
          <Row scope="row">{name}</Row>
          {cells.map((cell, index) => (
            <Cell key={index}>{cell}</Cell>
          ))}
        </tr>
      ))}
    </tbody>
  </chakra.table>
);
