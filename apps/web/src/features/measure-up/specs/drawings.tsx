import type { MeasureUpView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { HardwareDrawing } from '../../../components/drawing/hardware-drawing';
import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import type { ShockFigure } from '../../../components/drawing/shock-figure';
import type { DimensionKey } from '../../../components/drawing/dimensions';
import { lengthOf } from './read';
import type { Raw } from './spec';

const usual: ShockFigure = {
  eyeToEyeMm: 210,
  strokeMm: 55,
  bodyEnd: { kind: 'eyelet', boreMm: 15 },
  shaftEnd: { kind: 'eyelet', boreMm: 15 },
  spring: 'air',
  diameterMm: 50,
  reservoir: null,
  remote: false,
};

/** The rider's shock so far, with the figure that is being typed. */
export function YourShock({
  view,
  change = {},
  asked,
  text,
  ghost = false,
}: {
  view: MeasureUpView;
  change?: Partial<ShockFigure>;
  asked?: DimensionKey;
  text?: string;
  ghost?: boolean;
}) {
  const known = view.drawing ?? usual;
  const drawable = Object.fromEntries(Object.entries(change).filter(([, value]) => value !== undefined));
  const figure: ShockFigure = { ...usual, ...known, diameterMm: known.diameterMm ?? 50, ...drawable };
  const safe = {
    ...figure,
    eyeToEyeMm: Math.min(320, Math.max(120, figure.eyeToEyeMm)),
    strokeMm:
      figure.strokeMm === null ? null : Math.min(figure.eyeToEyeMm * 0.42, Math.max(15, figure.strokeMm)),
  };
  const texts: Partial<Record<DimensionKey, string>> = asked ? { [asked]: text?.trim() || '?' } : {};
  return (
    <ShockDrawing
      figure={safe}
      dimensions={
        asked === 'eye-to-eye' ? ['eye-to-eye'] : asked ? ['eye-to-eye', asked] : ['eye-to-eye', 'stroke']
      }
      asked={asked}
      texts={{ ...(view.drawing || asked === 'eye-to-eye' ? {} : { 'eye-to-eye': '?' }), ...texts }}
      ghost={ghost}
    />
  );
}

const within = (value: number | undefined, low: number, high: number, usualMm: number): number =>
  value === undefined ? usualMm : Math.min(high, Math.max(low, value));

/** The hardware of one end as it is typed, taken apart; a question mark where nothing is typed yet. */
export function HardwareSoFar({ raw, end }: { raw: Raw; end: 'frame' | 'link' }) {
  const read = (name: string) => lengthOf(raw, `${end}-${name}`);
  const boltMm = within(read('bolt'), 5, 14, 8);
  const typed = (name: string) => (read(name) === undefined ? '?' : undefined);
  return (
    <chakra.figure margin="0" _notFirst={{ marginTop: '6' }}>
      <HardwareDrawing
        figure={{
          widthMm: within(read('width'), 15, 80, 30),
          boltMm,
          boreMm: within(read('bore'), boltMm + 4, 22, Math.max(15, boltMm + 4)),
        }}
        asked="width"
        texts={{ width: typed('width'), bolt: typed('bolt'), bore: typed('bore') }}
      />
      <chakra.figcaption color="slate" fontSize="sm" marginTop="2">
        {end === 'frame' ? 'Frame end' : 'Link end'}, taken apart along its bolt
      </chakra.figcaption>
    </chakra.figure>
  );
}
