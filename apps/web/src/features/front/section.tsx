import { chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';

export function Section({ title, lead, children }: { title: string; lead?: string; children: ReactNode }) {
  const id = useId();
  return (
    <chakra.section aria-labelledby={id} marginTop={{ base: '12', md: '20' }}>
      <chakra.h2 id={id} fontSize={{ base: 'xl', md: '2xl' }} fontWeight="heavy" lineHeight="heading">
        {title}
      </chakra.h2>
      {lead ? (
        <chakra.p color="slate" fontSize="lg" marginTop="1" maxWidth="line">
          {lead}
        </chakra.p>
      ) : null}
      <chakra.div marginTop="6">{children}</chakra.div>
    </chakra.section>
  );
}
