import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

export interface SpecRow {
  label: ReactNode;
  /** The figure without its unit, right-aligned; or words. */
  value: ReactNode;
  unit?: string;
  /** Where it came from, in small. */
  source?: ReactNode;
}

const Cell = chakra('td', {
  base: { paddingBlock: '2', borderTopWidth: '1px', borderColor: 'hair', verticalAlign: 'top' },
});
const Head = chakra('th', {
  base: {
    paddingBlock: '2',
    paddingRight: '4',
    borderTopWidth: '1px',
    borderColor: 'hair',
    color: 'slate',
    fontWeight: 'medium',
    textAlign: 'left',
    verticalAlign: 'top',
  },
});

/** Name, figure, unit: hairlines only, figures right-aligned so that they can be compared down the column. */
export function SpecTable({ caption, rows }: { caption: string; rows: readonly SpecRow[] }) {
  return (
    <chakra.table width="full" borderBottomWidth="1px" borderColor="hair">
      <chakra.caption textAlign="left" fontWeight="bold" paddingBottom="2">
        {caption}
      </chakra.caption>
      <tbody>
        {rows.map((row, index) => (
          <tr key={index}>
            <Head scope="row">
              {row.label}
              {row.source ? (
                <chakra.span display="block" fontSize="sm" fontWeight="normal">
                  {row.source}
                </chakra.span>
              ) : null}
            </Head>
            {/* Words reach to the edge; figures stand before their units. */}
            <Cell textAlign="right" fontWeight="bold" colSpan={row.unit ? 1 : 2}>
              {row.value}
            </Cell>
            {row.unit ? (
              <Cell paddingLeft="1" color="slate" width="1%" whiteSpace="nowrap">
                {row.unit}
              </Cell>
            ) : null}
          </tr>
        ))}
      </tbody>
    </chakra.table>
  );
}
