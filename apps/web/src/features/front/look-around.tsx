import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../components/text-link';
import { Section } from './section';

const ways = [
  {
    to: '/workshops',
    title: 'Find a workshop',
    text: 'What each of them does, for how much, when it is open, and how far it is from your town.',
  },
  {
    to: '/shocks',
    title: 'Look at shocks by size',
    text: 'Every size on one millimetre scale, with data sheets, prices and who has it. Not checked for your bike.',
  },
  {
    to: '/help',
    title: 'Know the words',
    text: 'Eye-to-eye, stroke, trunnion, hardware: each explained with a drawing, and how to measure it.',
  },
] as const;

/** For those who want to see what there is before they measure. */
export function LookAround() {
  return (
    <Section title="Look around first">
      <chakra.ul
        listStyleType="none"
        display="grid"
        gridTemplateColumns={{ base: '1fr', md: 'repeat(3, 1fr)' }}
        columnGap="12"
        rowGap="8"
      >
        {ways.map(({ to, title, text }) => (
          <chakra.li key={to} borderLeftWidth="2px" borderColor="rule" paddingLeft="5">
            <chakra.h3 fontSize="lg" fontWeight="bold">
              <TextLink to={to} display="inline-flex" alignItems="center" minHeight="target">
                {title}
              </TextLink>
            </chakra.h3>
            <chakra.p color="slate" maxWidth="line">
              {text}
            </chakra.p>
          </chakra.li>
        ))}
      </chakra.ul>
    </Section>
  );
}
