import { chakra } from '@chakra-ui/react';
import { LinkButton } from '../../components/link-button';
import { CyclingShock } from './cycling-shock';

/** What it does, where to begin, and the drawing. */
export function Hero() {
  return (
    <chakra.div
      display="grid"
      gridTemplateColumns={{ base: 'minmax(0, 1fr)', lg: 'minmax(0, 5fr) minmax(0, 6fr)' }}
      columnGap="12"
      rowGap="6"
      alignItems="center"
    >
      <div>
        <chakra.h1
          tabIndex={-1}
          data-page-heading=""
          fontSize={{ base: '2xl', sm: '3xl' }}
          lineHeight="heading"
          fontWeight="heavy"
          letterSpacing="-0.015em"
          textWrap="balance"
        >
          Find the rear shock that fits your bike
        </chakra.h1>
        <chakra.p marginTop="3" fontSize={{ base: 'md', sm: 'lg' }} color="slate" maxWidth="30rem">
          Measure what you have. We compare it with your frame, figure by figure, and show what bolts straight
          in, what needs parts, and what won’t fit. Pay once and have it fitted near you.
        </chakra.p>
        <chakra.div display="flex" flexWrap="wrap" alignItems="center" columnGap="4" rowGap="2" marginTop="6">
          <LinkButton to="/measure-up" size="large" width={{ base: 'full', sm: 'auto' }}>
            Start your measure-up
          </LinkButton>
          <chakra.p fontSize="sm" color="slate">
            No account needed. Every answer is kept.
          </chakra.p>
        </chakra.div>
      </div>
      <CyclingShock />
    </chakra.div>
  );
}
