import { chakra } from '@chakra-ui/react';
import type { Verdict } from '@linkfell/contracts';
import { VerdictBadge } from '../../components/verdict-badge';
import { Section } from './section';

const meanings: [Verdict, string][] = [
  ['bolts-straight-in', 'Every check passes. Nothing to buy, nothing to do but fit it.'],
  [
    'fits-with-work',
    'It fits with parts or work that we name and price: a hardware kit, a spring, a remote.',
  ],
  ['needs-an-answer', 'Something that matters is not known. We say what to measure, or whom to ask.'],
  ['wont-fit', 'A check fails. We say which figure, and what would fit instead.'],
];

/** The four answers that a shock can get. */
export function VerdictKey() {
  return (
    <Section title="Four verdicts, and the figures behind them">
      <chakra.dl borderTopWidth="1px" borderColor="hair">
        {meanings.map(([verdict, text]) => (
          <chakra.div
            key={verdict}
            display="grid"
            gridTemplateColumns={{ base: '1fr', md: '16rem 1fr' }}
            columnGap="8"
            rowGap="1"
            alignItems="center"
            paddingBlock="3"
            borderBottomWidth="1px"
            borderColor="hair"
          >
            <dt>
              <VerdictBadge verdict={verdict} />
            </dt>
            <chakra.dd maxWidth="line">{text}</chakra.dd>
          </chakra.div>
        ))}
      </chakra.dl>
    </Section>
  );
}
