import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import type { Narrowing } from './api';

/** A word of the sentence that is changed in place, as on the fitting sheet. */
const Word = chakra('select', {
  base: {
    appearance: 'none',
    backgroundColor: 'transparent',
    color: 'ink',
    fontWeight: 'bold',
    fontSize: 'inherit',
    minHeight: 'target',
    // Close under the words, where a border would stand at the foot of the touch target.
    backgroundImage: 'linear-gradient(var(--lf-colors-bracken), var(--lf-colors-bracken))',
    backgroundSize: '100% 2px',
    backgroundPosition: '0 calc(50% + 0.75em)',
    backgroundRepeat: 'no-repeat',
    cursor: 'pointer',
    maxWidth: 'full',
    '& option': { bg: 'paper', color: 'ink', fontWeight: 'normal' },
  },
});

export interface NarrowSentenceProps {
  narrowing: Narrowing;
  onChange: (change: Partial<Narrowing>) => void;
  /** What follows after the two words: how many there are. */
  children: ReactNode;
}

/** What is shown, as one sentence. */
export function NarrowSentence({ narrowing, onChange, children }: NarrowSentenceProps) {
  return (
    <chakra.div fontSize="lg" color="slate" marginTop="2" marginBottom="6">
      Showing{' '}
      <Word
        aria-label="Spring"
        value={narrowing.spring}
        onChange={(event) => onChange({ spring: event.target.value as Narrowing['spring'] })}
      >
        <option value="either">air and coil</option>
        <option value="air">air only</option>
        <option value="coil">coil only</option>
      </Word>
      ,{' '}
      <Word
        aria-label="Reservoir"
        value={narrowing.reservoir}
        onChange={(event) => onChange({ reservoir: event.target.value as Narrowing['reservoir'] })}
      >
        <option value="either">with or without reservoir</option>
        <option value="with">with a reservoir</option>
        <option value="without">inline only</option>
      </Word>
      . <span role="status">{children}</span>
    </chakra.div>
  );
}
