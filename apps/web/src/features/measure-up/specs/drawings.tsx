import type { MeasureUpView } from '@linkfell/contracts';
import { ShockDrawing } from '../../../components/drawing/shock-drawing';
import type { ShockFigure } from '../../../components/drawing/shock-figure';
import type { DimensionKey } from '../../../components/drawing/dimensions';

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
