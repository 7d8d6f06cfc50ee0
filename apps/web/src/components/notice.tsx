import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

export type NoticeTone = 'tarn' | 'moss' | 'gorse' | 'brick' | 'heather';

const Box = chakra('div', {
  base: {
    borderLeftWidth: '4px',
    borderLeftColor: 'currentColor',
    borderRightRadius: 'control',
    paddingBlock: '3',
    paddingInline: '4',
    '& > *': { color: 'ink' },
  },
  variants: {
    tone: {
      tarn: { bg: 'tarnTint', color: 'tarn' },
      moss: { bg: 'mossTint', color: 'moss' },
      gorse: { bg: 'gorseTint', color: 'gorse' },
      brick: { bg: 'brickTint', color: 'brick' },
      heather: { bg: 'heatherTint', color: 'heather' },
    },
  },
  defaultVariants: { tone: 'tarn' },
});

export interface NoticeProps {
  tone?: NoticeTone;
  title?: string;
  children: ReactNode;
  /** For notices that appear while the page is open: "status" waits its turn, "alert" interrupts. */
  announce?: 'status' | 'alert';
}

/** Something the reader should know at this place. The title says what it is; the colour only helps. */
export function Notice({ tone = 'tarn', title, children, announce }: NoticeProps) {
  return (
    <Box tone={tone} role={announce}>
      {title ? <chakra.p fontWeight="bold">{title}</chakra.p> : null}
      <div>{children}</div>
    </Box>
  );
}
