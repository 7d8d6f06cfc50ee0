import type { CellView, MatchesView, MatchRow } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { formatDayShort } from '../../lib/format-date';
import { formatMoney } from '../../lib/format-money';
import { CellText } from './cell';
import { GroupHead, Name, priceOf, verdictOrder, type RowsProps } from './match-groups';
import { ViewLinks } from './view-links';

const Head = chakra('th', {
  base: {
    textAlign: 'left',
    color: 'slate',
    fontSize: 'sm',
    fontWeight: 'bold',
    lineHeight: 'heading',
    paddingBottom: '2',
    paddingRight: '3',
    verticalAlign: 'bottom',
  },
});
const Cell = chakra('td', {
  base: { paddingBlock: '3', paddingRight: '3', verticalAlign: 'middle', lineHeight: 'heading' },
});
const Line = chakra('tr', { base: { borderTopWidth: '1px', borderColor: 'hair' } });

/** Fixed, so that the drawings keep one scale and no long word can push the table off the page. */
const columns = [
  { head: 'All drawn to one scale', width: '17%' },
  { head: 'Shock', width: '12%' },
  { head: 'Eye-to-eye x stroke, mm', width: '11.5%' },
  { head: 'Mounts frame / link', width: '7%' },
  { head: 'Hardware', width: '8%' },
  { head: 'Spring for you', width: '9.5%' },
  { head: 'Reservoir', width: '8%' },
  { head: 'Remote', width: '8%' },
] as const;

function subPrice({ price, verdict }: MatchRow): string {
  if (verdict === 'wont-fit') return '';
  if (price.fittedMinor === null) return price.partsMinor === null ? 'sold out' : 'parts only';
  return price.selfFitMinor === null ? 'workshop only' : `${formatMoney(price.selfFitMinor)} self\u2011fit`;
}

/** Wide: a specification table, the rider's own shock on top, its outline grey behind every candidate. */
export function MatchTable({ view, sheet }: RowsProps) {
  return (
    <chakra.table width="full" tableLayout="fixed" borderCollapse="collapse">
      <chakra.caption srOnly>Shocks on sale, judged for your bike</chakra.caption>
      <thead>
        <tr>
          {columns.map(({ head, width }, index) => (
            <Head key={head} width={width}>
              {head}
              {index === 0 && view.own ? '; grey: yours' : ''}
            </Head>
          ))}
          <Head textAlign="right" width="9%">
            All-in, fitted
          </Head>
          <Head textAlign="right" paddingRight="0">
            Earliest at that price
          </Head>
        </tr>
      </thead>
      {view.own ? <Own own={view.own} sheet={sheet} /> : null}
      {verdictOrder.map((verdict) => {
        const rows = view.rows.filter((row) => row.verdict === verdict);
        if (rows.length === 0) return null;
        return (
          <tbody key={verdict}>
            <chakra.tr borderTopWidth="2px" borderColor="ink">
              <chakra.th
                colSpan={10}
                scope="rowgroup"
                textAlign="left"
                paddingTop="5"
                paddingBottom="2"
                fontWeight="normal"
              >
                <GroupHead verdict={verdict} count={rows.length} />
              </chakra.th>
            </chakra.tr>
            {rows.map((row) => (
              <Row key={row.sizeId} row={row} view={view} sheet={sheet} />
            ))}
          </tbody>
        );
      })}
    </chakra.table>
  );
}

function Own({ own, sheet }: { own: NonNullable<MatchesView['own']> } & Pick<RowsProps, 'sheet'>) {
  return (
    <tbody>
      <chakra.tr color="slate" borderTopWidth="2px" borderColor="ink">
        <Cell>
          <ShockDrawing figure={own.drawing} sheet={sheet} title="Your present shock" />
        </Cell>
        <Cell fontWeight="bold">Your present shock</Cell>
        <Cell>{own.sizeText}</Cell>
        <Cell colSpan={2}>{own.mounts}</Cell>
        <Cell colSpan={2}>{own.spring}</Cell>
        <Cell colSpan={3}>{own.remote}</Cell>
      </chakra.tr>
    </tbody>
  );
}

/** The sentence that decides stands once, on a line of its own across the figures. */
function Row({ row, view, sheet }: { row: MatchRow } & RowsProps) {
  const { cells } = row;
  const price = priceOf(row);
  const reason = row.verdict === 'fits-with-work' ? null : row.reason;
  const said = (cell: CellView): CellView =>
    reason !== null && cell.answer !== 'pass' ? { ...cell, sub: null } : cell;
  return (
    <>
      <Line>
        <Cell rowSpan={reason ? 2 : 1}>
          <ShockDrawing figure={row.drawing} behind={view.own?.drawing ?? null} sheet={sheet} />
        </Cell>
        <Cell>
          <Name to={row.sizeId}>
            {row.makerName} {row.modelName}
          </Name>
          <chakra.span display="block" color="slate" fontSize="sm">
            {row.spring}, {row.massG} g
          </chakra.span>
          <ViewLinks row={row} />
        </Cell>
        <Cell>
          <chakra.span whiteSpace="nowrap">
            <CellText cell={{ ...cells.eyeToEye, sub: null }} /> x{' '}
            <CellText cell={{ ...cells.stroke, sub: null }} />
          </chakra.span>
          {cells.stroke.answer === 'work' && cells.stroke.sub ? (
            <chakra.span display="block" color="slate" fontSize="sm">
              {cells.stroke.sub}
            </chakra.span>
          ) : null}
        </Cell>
        {[cells.mounts, cells.hardware, cells.spring, cells.reservoir, cells.remote].map((cell, index) => (
          <Cell key={index}>
            <CellText cell={said(cell)} />
          </Cell>
        ))}
        <Cell textAlign="right">
          <chakra.span fontWeight="heavy" fontSize="lg">
            {price === null ? '–' : formatMoney(price)}
          </chakra.span>
          <chakra.span display="block" color="slate" fontSize="sm">
            {subPrice(row)}
          </chakra.span>
        </Cell>
        <Cell textAlign="right" paddingRight="0">
          <Earliest row={row} />
        </Cell>
      </Line>
      {reason ? (
        <tr>
          <Cell colSpan={9} paddingTop="0" paddingRight="0" fontSize="sm">
            {reason}
          </Cell>
        </tr>
      ) : null}
    </>
  );
}

function Earliest({ row }: { row: MatchRow }) {
  if (!row.earliest || row.verdict === 'needs-an-answer') {
    return (
      <chakra.span color="slate">{row.verdict === 'needs-an-answer' ? 'after the answer' : '–'}</chakra.span>
    );
  }
  const { day, workshopName, distanceKm } = row.earliest;
  return (
    <>
      <chakra.span fontWeight="heavy" fontSize="lg" whiteSpace="nowrap">
        {formatDayShort(day)}
      </chakra.span>
      <chakra.span display="block" color="slate" fontSize="sm">
        {workshopName}
        {distanceKm === null ? '' : `, ${Math.round(distanceKm)} km`}
      </chakra.span>
    </>
  );
}
