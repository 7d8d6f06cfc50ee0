import { chakra } from '@chakra-ui/react';
import { TextLink } from '../../components/text-link';
import { Section } from './section';

const sides = [
  {
    title: 'For shops',
    text: 'List the shocks, springs and kits you have on the shelf. Orders arrive paid, each with the parts that belong together, and fittings are released for dispatch only when the workshop has accepted them.',
  },
  {
    title: 'For workshops',
    text: 'Bookings come with a job sheet: bike, old and new shock, which way round, the parts and the minutes. You accept or decline; what you set is recorded and sent to the rider.',
  },
];

/** The other two sides of the trade, with the two doors that there are. */
export function Partners() {
  return (
    <Section title="Shops and workshops">
      <chakra.div
        display="grid"
        gridTemplateColumns={{ base: '1fr', md: '1fr 1fr' }}
        columnGap="12"
        rowGap="8"
      >
        {sides.map(({ title, text }) => (
          <chakra.div key={title} borderLeftWidth="2px" borderColor="rule" paddingLeft="5">
            <chakra.h3 fontSize="lg" fontWeight="bold">
              {title}
            </chakra.h3>
            <chakra.p color="slate" marginTop="1" marginBottom="2" maxWidth="line">
              {text}
            </chakra.p>
            <chakra.p>
              <TextLink to="/sign-in">Sign in</TextLink> if you are with us, or{' '}
              <TextLink to="/contact">write to us</TextLink> to join.
            </chakra.p>
          </chakra.div>
        ))}
      </chakra.div>
    </Section>
  );
}
