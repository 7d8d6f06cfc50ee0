import { chakra } from '@chakra-ui/react';
import { controlRecipe } from './control-recipe';

export const TextInput = chakra('input', controlRecipe);
export const TextArea = chakra('textarea', controlRecipe);
