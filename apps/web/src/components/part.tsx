import { chakra } from '@chakra-ui/react';
import { useId, type ReactNode } from 'react';

/** A part of a page: a strong line, its heading on it, and what belongs to it. */
export function Part({ title, note, children }: { title: string; note?: ReactNode; children: ReactNode }) {
  const id = useId();
  return (
    <chakra.section aria-labelledby={id} marginTop="12">
      <chakra.div borderTopWidth="2px" borderColor="ink" paddingTop="3" marginBottom="4">
        <chakra.h2 id={id} fontSize="xl" fontWeight="heavy" lineHeight="heading">
          {title}
        </chakra.h2>
        {note ? (
          <chakra.p color="slate" marginTop="1" maxWidth="line">
            {note}
          </chakra.p>
        ) : null}
      </chakra.div>
      {children}
    </chakra.section>
  );
}
