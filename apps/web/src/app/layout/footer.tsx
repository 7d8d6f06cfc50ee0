import { chakra } from '@chakra-ui/react';
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

export function Footer() {
  return (
    <chakra.footer borderTopWidth="1px" borderColor="hair" marginTop="auto">
      <chakra.div
        maxWidth="page"
        marginInline="auto"
        paddingInline={{ base: '4', sm: '6', lg: '10' }}
        paddingBlock="6"
        display="flex"
        flexWrap="wrap"
        columnGap="6"
        alignItems="center"
      >
        <chakra.nav aria-label="Company" display="flex" flexWrap="wrap" columnGap="6">
          <Item to="/terms">Terms</Item>
          <Item to="/privacy">Privacy</Item>
          <Item to="/returns">Returns</Item>
          <Item to="/contact">Contact</Item>
        </chakra.nav>
        <chakra.p fontSize="sm" color="slate" marginLeft={{ md: 'auto' }} maxWidth="line">
          A demonstration. Linkfell Ltd, its partners and its places are invented; nothing is sold.
        </chakra.p>
      </chakra.div>
    </chakra.footer>
  );
}
