import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { buttonRecipe } from './button-recipe';

/** A link that looks like a button: it goes somewhere, it does nothing. */
export const LinkButton = chakra(Link, buttonRecipe);
