import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Title = chakra('h1', {
  base: {
    fontSize: { base: '2xl', md: '3xl' },
    lineHeight: 'heading',
    fontWeight: 'heavy',
    letterSpacing: '-0.01em',
    textWrap: 'balance',
  },
});

export interface PageHeadingProps {
  children: ReactNode;
  /** What stands small above: "Step 2 of 5 · Present shock". */
  above?: ReactNode;
  /** One or two sentences below. */
  lead?: ReactNode;
}

/** The one h1 of a page. Takes the focus when the reader arrives from another page. */
export function PageHeading({ children, above, lead }: PageHeadingProps) {
  return (
    <chakra.div marginBottom="6">
      {above ? (
        <chakra.p fontSize="sm" color="slate" fontWeight="medium" marginBottom="1">
          {above}
        </chakra.p>
      ) : null}
      <Title tabIndex={-1} data-page-heading="">
        {children}
      </Title>
      {lead ? (
        <chakra.p fontSize="lg" color="slate" maxWidth="line" marginTop="3">
          {lead}
        </chakra.p>
      ) : null}
    </chakra.div>
  );
}
