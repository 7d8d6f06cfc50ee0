import type { MatchesView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import type { ChangeEvent } from 'react';
import { TextLink } from '../../components/text-link';
import { formatMoney } from '../../lib/format-money';

/** A word of the sentence that can be changed in place: the browser's own list, underlined in bracken. */
const Word = chakra('select', {
  base: {
    appearance: 'none',
    bg: 'transparent',
    color: 'ink',
    fontWeight: 'bold',
    fontSize: 'inherit',
    minHeight: 'target',
    paddingInline: '0',
    borderBottomWidth: '2px',
    borderColor: 'bracken',
    cursor: 'pointer',
    // As wide as the word that is chosen, where the browser can; the comma then stands beside it.
    fieldSizing: 'content',
    maxWidth: 'full',
    '& option': { bg: 'paper', color: 'ink', fontWeight: 'normal' },
  },
});

/** A word and the comma behind it. */
const Together = chakra('span', { base: { whiteSpace: 'nowrap' } });

const budgets = [30000, 40000, 50000, 60000, 70000, 80000, 100000];

interface SentenceProps {
  view: MatchesView;
  onChange: (change: Record<string, string>) => void;
}

/** What is shown, said as one sentence that is edited in place and kept in the address. */
export function Sentence({ view, onChange }: SentenceProps) {
  const { applied, counts, rider, measureUpId } = view;
  const pick = (name: string) => (event: ChangeEvent<HTMLSelectElement>) =>
    onChange({ [name]: event.target.value });
  const amounts =
    applied.maxMinor === null ? budgets : [...new Set([...budgets, applied.maxMinor])].sort((a, b) => a - b);
  return (
    <chakra.div fontSize="lg" color="slate" marginBottom="6" lineHeight="text">
      Showing{' '}
      <Together>
        <Word aria-label="Spring" value={applied.spring} onChange={pick('spring')}>
          <option value="either">air and coil</option>
          <option value="air">air only</option>
          <option value="coil">coil only</option>
        </Word>
        ,
      </Together>{' '}
      <Together>
        <Word aria-label="Reservoir" value={applied.reservoir} onChange={pick('reservoir')}>
          <option value="either">with or without reservoir</option>
          <option value="with">with a reservoir</option>
          <option value="without">inline only</option>
        </Word>
        ,
      </Together>{' '}
      at{' '}
      <Together>
        <Word aria-label="Price at most" value={applied.maxMinor ?? ''} onChange={pick('maxMinor')}>
          <option value="1000000">any price</option>
          {amounts.map((amount) => (
            <option key={amount} value={amount}>
              up to {formatMoney(amount)}
            </option>
          ))}
        </Word>
        ,
      </Together>{' '}
      for{' '}
      <TextLink
        to={`/measure-up/${measureUpId}/weight`}
        display="inline-flex"
        alignItems="center"
        minHeight="target"
      >
        {rider.kg === null ? 'an unknown weight' : `${Number(rider.kg.toFixed(1))} kg`}
      </TextLink>{' '}
      at{' '}
      <TextLink
        to={`/measure-up/${measureUpId}/style`}
        display="inline-flex"
        alignItems="center"
        minHeight="target"
      >
        {rider.sagWindow ? `${rider.sagWindow} sag` : 'a sag not chosen'}
      </TextLink>
      ,{' '}
      <Together>
        <Word aria-label="Order" value={applied.order} onChange={pick('order')}>
          <option value="cheapest">cheapest first</option>
          <option value="earliest">earliest first</option>
          <option value="lightest">lightest first</option>
        </Word>
        .
      </Together>{' '}
      {counts['wont-fit']} that won’t fit are{' '}
      <Together>
        <Word aria-label="Shocks that won’t fit" value={applied.wontFit} onChange={pick('wontFit')}>
          <option value="hidden">hidden</option>
          <option value="shown">shown</option>
        </Word>
        .
      </Together>
    </chakra.div>
  );
}
