import { chakra } from '@chakra-ui/react';
import { controlRecipe } from './control-recipe';

/** The browser's own list: known to every hand and every screen reader. */
export const Select = chakra('select', {
  ...controlRecipe,
  base: { ...controlRecipe.base, cursor: 'pointer', paddingRight: '8' },
});
