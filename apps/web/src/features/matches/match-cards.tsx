import type { MatchRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { formatDayShort } from '../../lib/format-date';
import { formatMoney } from '../../lib/format-money';
import { CellText } from './cell';
import { GroupHead, Name, priceOf, verdictOrder, type RowsProps } from './match-groups';
import { ViewLinks } from './view-links';

/** Narrow: each shock a card with its drawing and only what deviates. */
export function MatchCards({ view, sheet }: RowsProps) {
  return (
    <>
      {verdictOrder.map((verdict) => {
        const rows = view.rows.filter((row) => row.verdict === verdict);
        if (rows.length === 0) return null;
        return (
          <chakra.section
            key={verdict}
            borderTopWidth="2px"
            borderColor="ink"
            paddingTop="4"
            marginBottom="6"
          >
            <chakra.h2 marginBottom="3" fontWeight="normal" fontSize="md">
              <GroupHead verdict={verdict} count={rows.length} />
            </chakra.h2>
            <chakra.ul display="grid" gap="4" listStyleType="none">
              {rows.map((row) => (
                <Card key={row.sizeId} row={row} view={view} sheet={sheet} />
              ))}
            </chakra.ul>
          </chakra.section>
        );
      })}
    </>
  );
}

function Card({ row, view, sheet }: { row: MatchRow } & RowsProps) {
  const { others, ...named } = row.cells;
  const deviating = [...Object.values(named), ...others].filter((cell) => cell.answer !== 'pass');
  const price = priceOf(row);
  return (
    <chakra.li bg="paper" borderWidth="1px" borderColor="hair" borderRadius="card" padding="4">
      <ShockDrawing figure={row.drawing} behind={view.own?.drawing ?? null} sheet={sheet} />
      <chakra.div display="flex" justifyContent="space-between" gap="3" marginTop="2">
        <div>
          <Name to={row.sizeId}>
            {row.makerName} {row.modelName}
          </Name>
          <chakra.p color="slate" fontSize="sm">
            {row.sizeKey} mm, {row.spring}, {row.massG} g
          </chakra.p>
          <ViewLinks row={row} />
        </div>
        <chakra.p textAlign="right" whiteSpace="nowrap">
          <chakra.span fontWeight="heavy" fontSize="lg">
            {price === null ? '' : formatMoney(price)}
          </chakra.span>
          <chakra.span display="block" color="slate" fontSize="sm">
            {row.earliest && row.verdict !== 'needs-an-answer' ? formatDayShort(row.earliest.day) : ''}
          </chakra.span>
        </chakra.p>
      </chakra.div>
      <chakra.ul marginTop="2" display="grid" gap="2" listStyleType="none">
        {deviating.map((cell, index) => (
          <li key={index}>
            <CellText cell={cell} />
          </li>
        ))}
      </chakra.ul>
    </chakra.li>
  );
}
