import type { CurvesView, RideView } from '@linkfell/contracts';
import { formatFigure } from '../../lib/format-figure';
import type { Line, Who } from './line-chart';

type Point = RideView['points'][number];

export interface Quantity {
  key: 'forceN' | 'rateNPerMm' | 'ratio';
  title: string;
  yLabel: string;
  unit: string;
  decimals: number;
  fromZero: boolean;
  /** What to look for. */
  lead: string;
}

export const quantities: readonly Quantity[] = [
  {
    key: 'forceN',
    title: 'Force at the wheel',
    yLabel: 'Force, N',
    unit: 'N',
    decimals: 0,
    fromZero: true,
    lead: 'How hard the wheel pushes back. A curve that ends higher takes a harder landing before it bottoms.',
  },
  {
    key: 'rateNPerMm',
    title: 'Rate at the wheel',
    yLabel: 'Rate, N/mm',
    unit: 'N/mm',
    decimals: 1,
    fromZero: true,
    lead: 'How much more it takes for one more millimetre. Low is soft over small stones, rising is support.',
  },
  {
    key: 'ratio',
    title: 'Leverage',
    yLabel: 'Wheel mm per shock mm',
    unit: '',
    decimals: 2,
    fromZero: false,
    lead: 'How far the wheel moves for a millimetre of shock: the frame’s own, whatever shock is in it.',
  },
];

const names: Record<Who, string> = { next: 'New', present: 'Yours' };

interface Drawn {
  who: Who;
  ride: RideView;
  points: (readonly [number, number])[];
}

const valueOf = (point: Point, key: Quantity['key']): number | null => point[key];

/** Both shocks as far as they have this quantity, the new one first. */
export function drawnOf(view: CurvesView, { key }: Quantity): Drawn[] {
  return (['next', 'present'] as const).flatMap((who) => {
    const ride = view[who];
    if (!ride) return [];
    const points = ride.points.flatMap((point) => {
      const value = valueOf(point, key);
      return value === null ? [] : [[point.wheelMm, value] as const];
    });
    return points.length === ride.points.length ? [{ who, ride, points }] : [];
  });
}

/** The value at a wheel travel, linear between two points. */
export function valueAt(points: readonly (readonly [number, number])[], wheelMm: number): number | null {
  const over = points.findIndex(([mm]) => mm >= wheelMm - 1e-9);
  const [after, before] = [points[over], points[over - 1]];
  if (!after) return null;
  if (!before) return after[1];
  return before[1] + ((wheelMm - before[0]) / (after[0] - before[0])) * (after[1] - before[1]);
}

/** One line where both are the same: two on top of each other could not be told apart. */
export function linesOf(view: CurvesView, quantity: Quantity): Line[] {
  const drawn = drawnOf(view, quantity);
  const [a, b] = drawn;
  const same =
    a && b && a.points.every(([mm, value], i) => mm === b.points[i]?.[0] && value === b.points[i]?.[1]);
  return (same ? drawn.slice(0, 1) : drawn).map(({ who, ride, points }) => {
    const sagMm = ride.spring?.sagWheelMm;
    const sag = sagMm === undefined || quantity.key === 'ratio' ? null : valueAt(points, sagMm);
    return {
      who,
      points,
      label: same ? 'Both' : names[who],
      sag: sag === null || sagMm === undefined ? null : [sagMm, sag],
    };
  });
}

/** The chart in words: where each begins and ends. */
export function tellQuantity(view: CurvesView, quantity: Quantity): string {
  const unit = quantity.unit && ` ${quantity.unit}`;
  const figure = (value: number | undefined): string =>
    value === undefined ? 'not known' : `${formatFigure(value, quantity.decimals)}${unit}`;
  return drawnOf(view, quantity)
    .map(({ ride, points }) => {
      const [first, last] = [points[0], points.at(-1)];
      const sag = ride.spring && quantity.key !== 'ratio' ? valueAt(points, ride.spring.sagWheelMm) : null;
      return `${ride.name}: ${figure(first?.[1])} at the top${sag === null ? '' : `, ${figure(sag)} at sag`}, ${figure(last?.[1])} at ${formatFigure(ride.travelMm, 0)} mm.`;
    })
    .join(' ');
}

const rowsShown = 8;

/** Every sixth part of the grid; a blank where a shock has no such travel. */
export function tableOf(view: CurvesView, quantity: Quantity): { heads: string[]; rows: string[][] } {
  const drawn = drawnOf(view, quantity);
  const end = Math.max(...drawn.map(({ ride }) => ride.travelMm));
  const rows = Array.from({ length: rowsShown + 1 }, (_, i) => {
    const wheelMm = (end * i) / rowsShown;
    return [
      formatFigure(wheelMm, 0),
      ...drawn.map(({ points }) => {
        const value = valueAt(points, wheelMm);
        return value === null ? '–' : formatFigure(value, quantity.decimals);
      }),
    ];
  });
  return { heads: ['Wheel, mm', ...drawn.map(({ who }) => names[who])], rows };
}
