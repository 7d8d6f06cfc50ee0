import { defineRecipe } from '@chakra-ui/react';

/** The look of everything that is typed or chosen into. 16 px at least, or telephones zoom the page. */
export const controlRecipe = defineRecipe({
  base: {
    width: 'full',
    minHeight: 'target',
    paddingInline: '3',
    paddingBlock: '2',
    bg: 'paper',
    color: 'ink',
    fontSize: 'md',
    borderWidth: '1px',
    borderColor: 'rule',
    borderRadius: 'control',
    transitionProperty: 'border-color',
    transitionDuration: 'quick',
    _hover: { borderColor: 'ink' },
    '&[aria-invalid=true]': { borderColor: 'brick', borderWidth: '2px' },
    _disabled: { bg: 'wash', color: 'slate', cursor: 'not-allowed' },
  },
});
