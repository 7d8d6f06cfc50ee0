import { defineRecipe } from '@chakra-ui/react';

/** One look for buttons and for links that act as one. Borders stay, seen or not, for forced colours. */
export const buttonRecipe = defineRecipe({
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    gap: '2',
    minHeight: 'target',
    minWidth: 'target',
    paddingBlock: '2',
    paddingInline: '5',
    borderWidth: '2px',
    borderColor: 'transparent',
    borderRadius: 'control',
    fontWeight: 'bold',
    lineHeight: 'heading',
    textAlign: 'center',
    textDecoration: 'none',
    cursor: 'pointer',
    transitionProperty: 'background-color, border-color, color',
    transitionDuration: 'quick',
    '&:disabled, &[aria-disabled=true]': { opacity: '0.55', cursor: 'not-allowed' },
  },
  variants: {
    tone: {
      primary: { bg: 'bracken', color: 'onBracken', '&:hover:not(:disabled)': { bg: 'brackenDeep' } },
      plain: {
        bg: 'paper',
        color: 'ink',
        borderColor: 'rule',
        '&:hover:not(:disabled)': { borderColor: 'ink', bg: 'wash' },
      },
      quiet: {
        color: 'tarn',
        paddingInline: '2',
        textDecoration: 'underline',
        textDecorationThickness: '1px',
        textUnderlineOffset: '0.25em',
        '&:hover:not(:disabled)': { color: 'tarnDeep', textDecorationThickness: '2px' },
      },
      danger: {
        bg: 'paper',
        color: 'brick',
        borderColor: 'brick',
        '&:hover:not(:disabled)': { bg: 'brickTint' },
      },
    },
    size: {
      normal: { fontSize: 'md' },
      large: { fontSize: 'lg', minHeight: '3.5rem', paddingInline: '6', fontWeight: 'heavy' },
    },
    wide: { yes: { width: 'full' }, no: {} },
  },
  defaultVariants: { tone: 'primary', size: 'normal', wide: 'no' },
});
