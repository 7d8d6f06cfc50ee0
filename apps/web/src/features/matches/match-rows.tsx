import type { MatchesView, MatchRow, Verdict } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import { commonSheet } from '../../components/drawing/sheet';
import type { Box } from '../../components/drawing/shapes';
import { VerdictBadge } from '../../components/verdict-badge';
import { formatDayShort } from '../../lib/format-date';
import { formatMoney } from '../../lib/format-money';
import { CellText } from './cell';

const order: readonly Verdict[] = ['bolts-straight-in', 'fits-with-work', 'needs-an-answer', 'wont-fit'];
const notes: Record<Verdict, string> = {
  'bolts-straight-in': 'nothing to buy or do',
  'fits-with-work': 'named parts or work',
  'needs-an-answer': 'something that matters is not known',
  'wont-fit': 'with the reason',
};

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
  base: {
    paddingBlock: '3',
    paddingRight: '4',
    borderTopWidth: '1px',
    borderColor: 'hair',
    verticalAlign: 'middle',
    lineHeight: 'heading',
  },
});
const Name = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'target',
    fontWeight: 'heavy',
    color: 'ink',
    textDecoration: 'underline',
    textDecorationColor: 'rule',
    textUnderlineOffset: '0.2em',
    _hover: { textDecorationColor: 'bracken' },
  },
});

const headings = [
  'Eye-to-eye x stroke, mm',
  'Mounts frame / link',
  'Hardware',
  'Spring for you',
  'Reservoir',
  'Remote',
];

/** The one scale on which all drawings of the sheet stand. */
export const sheetOf = (view: MatchesView): Box =>
  commonSheet([...view.rows.map((row) => row.drawing), ...(view.own ? [view.own.drawing] : [])]);

const priceOf = (row: MatchRow) => row.price.fittedMinor ?? row.price.partsMinor;
function subPrice({ price }: MatchRow): string {
  if (price.fittedMinor === null) return price.partsMinor === null ? 'sold out' : 'parts only';
  return price.selfFitMinor === null
    ? 'fitted, workshop only'
    : `${formatMoney(price.selfFitMinor)} self-fit`;
}

interface RowsProps {
  view: MatchesView;
  sheet: Box;
}

/** Wide: a specification table, the rider's own shock on top, its outline grey behind every candidate. */
export function MatchTable({ view, sheet }: RowsProps) {
  const { own } = view;
  return (
    <chakra.table
      display={{ base: 'none', lg: 'table' }}
      width="full"
      fontSize="md"
      borderCollapse="collapse"
    >
      <chakra.caption srOnly>Shocks on sale, judged for your bike</chakra.caption>
      <thead>
        <tr>
          <Head width="14rem">All drawn to one scale{own ? '; grey: your shock' : ''}</Head>
          <Head>Shock</Head>
          {headings.map((heading) => (
            <Head key={heading}>{heading}</Head>
          ))}
          <Head textAlign="right">All-in, fitted</Head>
          <Head textAlign="right" paddingRight="0">
            Earliest at that price
          </Head>
        </tr>
      </thead>
      {own ? (
        <tbody>
          <chakra.tr color="slate" borderTopWidth="2px" borderColor="ink">
            <Cell>
              <ShockDrawing figure={own.drawing} sheet={sheet} title="Your present shock" />
            </Cell>
            <Cell fontWeight="bold">Your present shock</Cell>
            <Cell>{own.sizeText}</Cell>
            <Cell>{own.mounts}</Cell>
            <Cell />
            <Cell>{own.spring}</Cell>
            <Cell />
            <Cell>{own.remote}</Cell>
            <Cell />
            <Cell />
          </chakra.tr>
        </tbody>
      ) : null}
      {order.map((verdict) => {
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
              <TableRow key={row.sizeId} row={row} view={view} sheet={sheet} />
            ))}
          </tbody>
        );
      })}
    </chakra.table>
  );
}

const GroupHead = ({ verdict, count }: { verdict: Verdict; count: number }) => (
  <chakra.span display="inline-flex" alignItems="center" gap="3" flexWrap="wrap">
    <VerdictBadge verdict={verdict} />
    <chakra.span color="slate" fontSize="sm">
      {count === 1 ? '1 shock' : `${count} shocks`}, {notes[verdict]}
    </chakra.span>
  </chakra.span>
);

function TableRow({ row, view, sheet }: { row: MatchRow } & RowsProps) {
  const { cells } = row;
  const price = priceOf(row);
  return (
    <tr>
      <Cell>
        <ShockDrawing figure={row.drawing} behind={view.own?.drawing ?? null} sheet={sheet} />
      </Cell>
      <Cell>
        <Name to={row.sizeId}>
          {row.makerName} {row.modelName}
        </Name>
        <chakra.span display="block" color="slate" fontSize="sm">
          {row.spring}, {row.massG} g
        </chakra.span>
        {row.reason && row.verdict !== 'fits-with-work' ? (
          <chakra.span display="block" fontSize="sm" marginTop="1" maxWidth="16rem">
            {row.reason}
          </chakra.span>
        ) : null}
      </Cell>
      <Cell whiteSpace="nowrap">
        <CellText cell={cells.eyeToEye} /> x <CellText cell={{ ...cells.stroke, sub: null }} />
      </Cell>
      <Cell>
        <CellText cell={cells.mounts} />
      </Cell>
      <Cell>
        <CellText cell={cells.hardware} />
      </Cell>
      <Cell>
        <CellText cell={cells.spring} />
      </Cell>
      <Cell>
        <CellText cell={cells.reservoir} />
      </Cell>
      <Cell>
        <CellText cell={cells.remote} />
      </Cell>
      <Cell textAlign="right" whiteSpace="nowrap">
        <chakra.span fontWeight="heavy" fontSize="lg">
          {price === null ? '–' : formatMoney(price)}
        </chakra.span>
        <chakra.span display="block" color="slate" fontSize="sm">
          {row.verdict === 'wont-fit' ? '' : subPrice(row)}
        </chakra.span>
      </Cell>
      <Cell textAlign="right" paddingRight="0">
        <Earliest row={row} />
      </Cell>
    </tr>
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

/** Narrow: each shock a card with its drawing and only what deviates. */
export function MatchCards({ view, sheet }: RowsProps) {
  return (
    <chakra.div display={{ base: 'block', lg: 'none' }}>
      {order.map((verdict) => {
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
    </chakra.div>
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
