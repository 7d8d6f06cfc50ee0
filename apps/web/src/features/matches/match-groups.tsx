import type { MatchesView, MatchRow, Verdict } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { commonSheet } from '../../components/drawing/sheet';
import type { Box } from '../../components/drawing/shapes';
import { VerdictBadge } from '../../components/verdict-badge';

export const verdictOrder: readonly Verdict[] = [
  'bolts-straight-in',
  'fits-with-work',
  'needs-an-answer',
  'wont-fit',
];
const notes: Record<Verdict, string> = {
  'bolts-straight-in': 'nothing to buy or do',
  'fits-with-work': 'named parts or work',
  'needs-an-answer': 'something that matters is not known',
  'wont-fit': 'with the reason',
};

export interface RowsProps {
  view: MatchesView;
  sheet: Box;
}

export const Name = chakra(Link, {
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

/** The one scale on which all drawings of the sheet stand. */
export const sheetOf = (view: MatchesView): Box =>
  commonSheet([...view.rows.map((row) => row.drawing), ...(view.own ? [view.own.drawing] : [])]);

export const priceOf = ({ price }: MatchRow): number | null => price.fittedMinor ?? price.partsMinor;

export const GroupHead = ({ verdict, count }: { verdict: Verdict; count: number }) => (
  <chakra.span display="inline-flex" alignItems="center" gap="3" flexWrap="wrap">
    <VerdictBadge verdict={verdict} />
    <chakra.span color="slate" fontSize="sm">
      {count === 1 ? '1 shock' : `${count} shocks`}, {notes[verdict]}
    </chakra.span>
  </chakra.span>
);
