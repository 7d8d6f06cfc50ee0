import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

const Item = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'target',
    color: 'slate',
    fontWeight: 'medium',
    _hover: { color: 'ink', textDecoration: 'underline' },
  },
});

/** The fells in one line, on which the foot of the page rests. */
const Ridge = () => (
  <chakra.svg viewBox="0 0 1200 56" width="full" height="56px" preserveAspectRatio="none" aria-hidden="true">
    <path
      d="M0 55 C90 55 150 47 214 38 C262 31 292 12 330 9 C356 7 372 23 408 27 C470 34 520 36 590 46 C690 58 740 50 812 40 C872 32 900 20 948 21 C990 22 1020 38 1080 43 C1130 47 1160 44 1200 42"
      fill="none"
      stroke="var(--lf-colors-rule)"
      strokeWidth="1.2"
      vectorEffect="non-scaling-stroke"
    />
  </chakra.svg>
);

/** A row of links; on a telephone as wide as the page. */
const Links = ({ label, children }: { label: string; children: ReactNode }) => (
  <chakra.nav
    aria-label={label}
    display="flex"
    flexWrap="wrap"
    justifyContent={{ base: 'space-between', md: 'flex-start' }}
    width={{ base: 'full', md: 'auto' }}
    columnGap={{ base: '2', md: '6' }}
  >
    {children}
  </chakra.nav>
);

export function Footer() {
  return (
    <chakra.footer marginTop="auto">
      <Ridge />
      <chakra.div
        maxWidth="page"
        marginInline="auto"
        paddingInline={{ base: '4', sm: '6', lg: '10' }}
        paddingTop="2"
        paddingBottom="6"
        display="flex"
        flexWrap="wrap"
        columnGap="6"
        alignItems="center"
      >
        <Links label="Look around">
          <Item to="/shocks">Shocks</Item>
          <Item to="/workshops">Workshops</Item>
          <Item to="/help">Help</Item>
        </Links>
        <Links label="Company">
          <Item to="/terms">Terms</Item>
          <Item to="/privacy">Privacy</Item>
          <Item to="/returns">Returns</Item>
          <Item to="/contact">Contact</Item>
        </Links>
        <chakra.p fontSize="sm" color="slate" marginLeft={{ md: 'auto' }} maxWidth="line">
          A demonstration. Linkfell Ltd, its partners and its places are invented; nothing is sold.
        </chakra.p>
      </chakra.div>
    </chakra.footer>
  );
}
