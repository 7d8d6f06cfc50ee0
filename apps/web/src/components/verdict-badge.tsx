import { chakra } from '@chakra-ui/react';
import type { Verdict } from '@linkfell/contracts';
import { VerdictShape } from './verdict-shape';
import { verdictTones, verdictWords } from './verdict-words';

const Badge = chakra('span', {
  base: {
    display: 'inline-flex',
    alignItems: 'center',
    gap: '2',
    paddingBlock: '1',
    paddingLeft: '2',
    paddingRight: '3',
    borderRadius: 'control',
    fontSize: 'sm',
    fontWeight: 'heavy',
    lineHeight: 'heading',
    // Seen in forced colours only, where the grounds vanish.
    borderWidth: '1px',
    borderColor: 'transparent',
  },
  variants: {
    tone: {
      moss: { color: 'moss', bg: 'mossTint' },
      gorse: { color: 'gorse', bg: 'gorseTint' },
      heather: { color: 'heather', bg: 'heatherTint' },
      brick: { color: 'brick', bg: 'brickTint' },
    },
    size: { normal: {}, large: { fontSize: 'lg', gap: '3', paddingBlock: '2' } },
  },
  defaultVariants: { size: 'normal' },
});

/** A verdict in its word, its shape and its colour, which never speaks alone. */
export function VerdictBadge({ verdict, size = 'normal' }: { verdict: Verdict; size?: 'normal' | 'large' }) {
  return (
    <Badge tone={verdictTones[verdict]} size={size}>
      <VerdictShape verdict={verdict} size={size === 'large' ? 24 : 18} />
      {verdictWords[verdict]}
    </Badge>
  );
}
