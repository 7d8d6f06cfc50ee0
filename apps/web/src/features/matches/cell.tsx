import type { CellView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { VerdictShape } from '../../components/verdict-shape';
import { verdictOfAnswer, verdictTones } from '../../components/verdict-words';

const Deviation = chakra('span', {
  base: {
    display: 'inline-flex',
    gap: '1',
    alignItems: 'flex-start',
    fontWeight: 'bold',
    borderRadius: 'control',
    paddingInline: '1',
  },
  variants: {
    tone: {
      moss: { color: 'ink' },
      gorse: { color: 'gorse', bg: 'gorseTint' },
      heather: { color: 'heather', bg: 'heatherTint' },
      brick: { color: 'brick', bg: 'brickTint' },
    },
  },
});

/** A figure and its unit stay on one line. */
const unbroken = (text: string): string =>
  text.replace(/(\d) (bar|psi|mm|lb\/in|%|kg|g)(?=\W|$)/g, '$1\u00a0$2');

/** A figure of the fitting sheet: plain where it agrees, in its verdict's colour and shape where it does not. */
export function CellText({ cell }: { cell: CellView }) {
  const verdict = verdictOfAnswer[cell.answer];
  return (
    <>
      {cell.answer === 'pass' ? (
        unbroken(cell.text)
      ) : (
        <Deviation tone={verdictTones[verdict]}>
          <chakra.span flexShrink="0" marginTop="1px">
            <VerdictShape verdict={verdict} size={14} />
          </chakra.span>
          {unbroken(cell.text)}
        </Deviation>
      )}
      {cell.sub ? (
        <chakra.span display="block" color="slate" fontSize="sm" lineHeight="heading" marginTop="0.5">
          {unbroken(cell.sub)}
        </chakra.span>
      ) : null}
    </>
  );
}
