import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';

const style = {
  base: {
    color: 'tarn',
    textDecoration: 'underline',
    textDecorationThickness: '1px',
    textUnderlineOffset: '0.2em',
    _hover: { color: 'tarnDeep', textDecorationThickness: '2px' },
  },
};

/** A link in running text to a page of ours. */
export const TextLink = chakra(Link, style);

/** The same for addresses outside the router: mail, telephone, files. */
export const OuterLink = chakra('a', style);
