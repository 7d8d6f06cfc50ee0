import { chakra } from '@chakra-ui/react';
import { Link, NavLink } from 'react-router-dom';
import { Mark } from '../../components/mark';
import { ColourModeSwitch } from './colour-mode-switch';
import { useSignedIn } from './use-signed-in';

const Home = chakra(Link, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2',
    minHeight: 'target',
    marginRight: 'auto',
    // The mark's own margin, so that it stands on the left edge of the page.
    marginLeft: '-2px',
    fontSize: 'xl',
    fontWeight: 'heavy',
    letterSpacing: '-0.02em',
    color: 'ink',
  },
});

const Item = chakra(NavLink, {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    minHeight: 'target',
    color: 'slate',
    fontWeight: 'medium',
    whiteSpace: 'nowrap',
    borderBottomWidth: '2px',
    borderTopWidth: '2px',
    borderColor: 'transparent',
    _hover: { color: 'ink' },
    '&[aria-current=page]': { color: 'ink', borderBottomColor: 'bracken' },
    // Forced colours draw transparent borders too: only the one that means something may be seen.
    '@media (forced-colors: active)': {
      borderColor: 'Canvas',
      '&[aria-current=page]': { borderBottomColor: 'Highlight' },
    },
  },
});

/** Ways to look around: where there is no room for them, they stand at the foot of the page. */
const looking = [
  { to: '/shocks', name: 'Shocks' },
  { to: '/workshops', name: 'Workshops' },
  { to: '/help', name: 'Help' },
] as const;

/** On a telephone two rows: the name and the colours, then the three ways in. */
export function Header() {
  const signedIn = useSignedIn();
  return (
    <chakra.header borderBottomWidth="1px" borderColor="hair" bg="chalk">
      <chakra.div
        display="flex"
        flexWrap="wrap"
        alignItems="center"
        columnGap={{ base: '4', md: '8' }}
        maxWidth="page"
        marginInline="auto"
        paddingInline={{ base: '4', sm: '6', lg: '10' }}
        paddingBlock={{ base: '1', md: '2' }}
      >
        <Home to="/">
          <Mark />
          Linkfell
        </Home>
        <chakra.nav
          aria-label="Main"
          display="flex"
          justifyContent="space-between"
          gap={{ base: '2', sm: '6' }}
          order={{ base: '3', md: '0' }}
          width={{ base: 'full', md: 'auto' }}
        >
          <Item to="/measure-up">Measure-up</Item>
          {looking.map(({ to, name }) => (
            <Item key={to} to={to} display={{ base: 'none', lg: 'inline-flex' }}>
              {name}
            </Item>
          ))}
          <Item to="/find-order">Find my order</Item>
          {/* As wide as either word, so that the rest of the header stays where it is. */}
          <Item
            to={signedIn ? '/desk' : '/sign-in'}
            minWidth="3.5rem"
            justifyContent={{ base: 'flex-end', md: 'flex-start' }}
          >
            {signedIn ? 'Desk' : 'Sign in'}
          </Item>
        </chakra.nav>
        <ColourModeSwitch />
      </chakra.div>
    </chakra.header>
  );
}
