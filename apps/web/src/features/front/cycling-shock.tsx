import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { commonSheet } from '../../components/drawing/sheet';
import { ShockDrawing } from '../../components/drawing/shock-drawing';
import type { DimensionKey } from '../../components/drawing/dimensions';
import type { ShockFigure } from '../../components/drawing/shock-figure';
import { formatFigure } from '../../lib/format-figure';
import { useReducedMotion } from '../../lib/use-media';
import { PlayButton } from './play-button';
import { useCycle } from './use-cycle';

const eye = { kind: 'eyelet', boreMm: 15 } as const;
const figure: ShockFigure = {
  eyeToEyeMm: 210,
  strokeMm: 55,
  bodyEnd: eye,
  shaftEnd: eye,
  spring: 'air',
  diameterMm: 54,
  reservoir: { lengthMm: 96, diameterMm: 38, positionDeg: 0 },
  remote: false,
  usedStrokeMm: 52,
};
const dimensions: readonly DimensionKey[] = ['eye-to-eye', 'stroke'];
const sheet = commonSheet([figure], dimensions);
const usedMm = 52;

const Cell = chakra('div', {
  base: {
    paddingBlock: '2',
    paddingInline: { base: '3', sm: '4' },
    borderLeftWidth: '1px',
    borderColor: 'hair',
    _first: { borderLeftWidth: '0' },
  },
});
const Label = chakra('dt', {
  base: { fontSize: 'sm', color: 'slate', lineHeight: 'heading', whiteSpace: 'nowrap' },
});
const Figure = chakra('dd', {
  base: { fontWeight: 'heavy', fontSize: 'lg', fontVariantNumeric: 'tabular-nums', whiteSpace: 'nowrap' },
});

/** A shock at work on its drawing sheet, with the figures of the moment in the sheet's title block. */
export function CyclingShock() {
  const still = useReducedMotion();
  const [paused, setPaused] = useState(false);
  const position = useCycle(!still && !paused);
  const compressed = Math.round(position * usedMm * 10) / 10;
  return (
    <chakra.figure bg="paper" borderWidth="1px" borderColor="rule" borderRadius="card" overflow="hidden">
      <chakra.div
        paddingInline={{ base: '2', sm: '5' }}
        paddingTop={{ base: '2', sm: '5' }}
        paddingBottom="2"
      >
        <ShockDrawing
          figure={figure}
          dimensions={dimensions}
          asked="eye-to-eye"
          compressedMm={compressed}
          sheet={sheet}
          ghost
          title="A rear shock with its two deciding dimensions, eye-to-eye and stroke"
        />
      </chakra.div>
      <chakra.figcaption
        display="flex"
        flexWrap="wrap"
        alignItems="stretch"
        justifyContent="space-between"
        borderTopWidth="1px"
        borderColor="hair"
      >
        <chakra.dl display="flex" flex="1">
          <Cell>
            <Label>Eye-to-eye</Label>
            <Figure minWidth="5.5rem">{formatFigure(figure.eyeToEyeMm - compressed, 1)} mm</Figure>
          </Cell>
          <Cell>
            <Label>Stroke used</Label>
            <Figure minWidth="4.5rem">{formatFigure(compressed, 1)} mm</Figure>
          </Cell>
          <Cell display={{ base: 'none', sm: 'block' }}>
            <Label>Size</Label>
            <Figure>210 × 55</Figure>
          </Cell>
        </chakra.dl>
        {still ? null : <PlayButton paused={paused} onChange={setPaused} />}
      </chakra.figcaption>
    </chakra.figure>
  );
}
