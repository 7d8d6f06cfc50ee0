import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Cell = chakra('div', {
  base: {
    paddingBlock: '2',
    paddingInline: { base: '3', sm: '5' },
    borderLeftWidth: '1px',
    borderColor: 'hair',
    _first: { borderLeftWidth: '0' },
  },
});

export interface DrawingSheetProps {
  /** What is drawn, in one sentence. */
  caption: ReactNode;
  /** The figures of the drawing, as in the title block of a workshop drawing. */
  block?: readonly { label: string; text: string }[];
  /** What changes the drawing. */
  controls?: ReactNode;
  children: ReactNode;
}

/** A drawing on its sheet, with its title block below. */
export function DrawingSheet({ caption, block = [], controls, children }: DrawingSheetProps) {
  return (
    <chakra.figure
      bg="paper"
      borderWidth="1px"
      borderColor="rule"
      borderRadius="card"
      overflow="hidden"
      marginBlock="8"
      _first={{ marginTop: '0' }}
    >
      <chakra.div padding={{ base: '3', sm: '6' }} display="grid" justifyItems="center" gap="6">
        {children}
      </chakra.div>
      {controls ? (
        <chakra.div
          borderTopWidth="1px"
          borderColor="hair"
          paddingBlock="3"
          paddingInline={{ base: '3', sm: '5' }}
        >
          {controls}
        </chakra.div>
      ) : null}
      {block.length > 0 ? (
        <chakra.dl display="flex" borderTopWidth="1px" borderColor="hair" aria-live="polite">
          {block.map(({ label, text }) => (
            <Cell key={label} flex={{ base: '1', sm: '0 1 auto' }} minWidth={{ sm: '9rem' }}>
              <chakra.dt fontSize="sm" color="slate" lineHeight="heading">
                {label}
              </chakra.dt>
              <chakra.dd
                fontWeight="heavy"
                fontSize="lg"
                fontVariantNumeric="tabular-nums"
                whiteSpace="nowrap"
              >
                {text}
              </chakra.dd>
            </Cell>
          ))}
        </chakra.dl>
      ) : null}
      <chakra.figcaption
        borderTopWidth="1px"
        borderColor="hair"
        paddingBlock="2"
        paddingInline={{ base: '3', sm: '5' }}
        fontSize="sm"
        color="slate"
      >
        {caption}
      </chakra.figcaption>
    </chakra.figure>
  );
}
