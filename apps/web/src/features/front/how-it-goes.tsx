import { chakra } from '@chakra-ui/react';
import { Section } from './section';

const steps = [
  {
    title: 'Measure up',
    text: 'One question at a time, with a drawing of what to measure and where. Every answer is kept; “I don’t know” is always allowed.',
  },
  {
    title: 'Compare to scale',
    text: 'On the fitting sheet every candidate is drawn at the scale of your own shock, its checks beside it as figures, its price all-in.',
  },
  {
    title: 'Plan and pay once',
    text: 'Shock, parts and fitting in one payment, VAT included. Fit it yourself where that is allowed, or pick a workshop and a time.',
  },
  {
    title: 'Ride it set up',
    text: 'The workshop records spring or pressure and torques as set. You get a card with them, and where to start from.',
  },
];

/** The rider's way in four steps. */
export function HowItGoes() {
  return (
    <Section title="How it goes" lead="From the shock on your bike to the next one, fitted and set up.">
      <chakra.ol
        display="grid"
        gridTemplateColumns={{ base: '1fr', sm: '1fr 1fr', lg: 'repeat(4, 1fr)' }}
        columnGap="8"
        rowGap="6"
      >
        {steps.map(({ title, text }, index) => (
          <chakra.li key={title} display="grid" gridTemplateColumns="2.25rem 1fr" columnGap="3">
            <chakra.span
              aria-hidden="true"
              display="grid"
              placeItems="center"
              width="2.25rem"
              height="2.25rem"
              borderWidth="2px"
              borderColor="bracken"
              borderRadius="round"
              color="bracken"
              fontWeight="heavy"
            >
              {index + 1}
            </chakra.span>
            <div>
              <chakra.h3 fontWeight="bold" fontSize="lg" lineHeight="heading" paddingTop="1.5">
                {title}
              </chakra.h3>
              <chakra.p color="slate" marginTop="1">
                {text}
              </chakra.p>
            </div>
          </chakra.li>
        ))}
      </chakra.ol>
    </Section>
  );
}
