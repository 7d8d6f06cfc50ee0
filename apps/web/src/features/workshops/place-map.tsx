import { useId } from 'react';

export interface Spot {
  id: string;
  name: string;
  latitude: number;
  longitude: number;
}

const kmPerDegree = (6371.0088 * Math.PI) / 180;
const rad = Math.PI / 180;

/** Kilometres east and south of the middle: flat enough for one district. */
export function flatten(spots: readonly Spot[]): (Spot & { x: number; y: number })[] {
  const middle = (values: number[]) => (Math.min(...values) + Math.max(...values)) / 2;
  const latitude = middle(spots.map((spot) => spot.latitude));
  const longitude = middle(spots.map((spot) => spot.longitude));
  return spots.map((spot) => ({
    ...spot,
    x: (spot.longitude - longitude) * kmPerDegree * Math.cos(latitude * rad),
    y: (latitude - spot.latitude) * kmPerDegree,
  }));
}

export interface PlaceMapProps {
  towns: readonly Spot[];
  workshops: readonly Spot[];
  /** The town that distances count from. */
  from?: string;
  /** The one workshop that the page is about. */
  chosen?: string;
}

const small = { fontSize: '0.92px', fontWeight: 600 } as const;
const ground = {
  stroke: 'var(--drawing-ground, var(--lf-colors-paper))',
  strokeWidth: 0.28,
  paintOrder: 'stroke',
  strokeLinejoin: 'round',
} as const;

/** A hexagon like a bolt's head about a place, km. */
const hexagon = (x: number, y: number, r: number): string =>
  Array.from({ length: 6 }, (_, index) => {
    const turn = (index * Math.PI) / 3 + Math.PI / 6;
    return `${(x + r * Math.cos(turn)).toFixed(3)},${(y + r * Math.sin(turn)).toFixed(3)}`;
  }).join(' ');

/** Our own map: towns as dots, workshops as bolt heads numbered as in the list, a scale in kilometres. */
export function PlaceMap({ towns, workshops, from, chosen }: PlaceMapProps) {
  const id = useId();
  const all = flatten([...towns, ...workshops]);
  const [places, marked] = [all.slice(0, towns.length), all.slice(towns.length)];
  const [xs, ys] = [all.map(({ x }) => x), all.map(({ y }) => y)];
  const [x1, x2] = [Math.min(...xs) - 2.5, Math.max(...xs) + 2.5];
  const [y1, y2] = [Math.min(...ys) - 1.6, Math.max(...ys) + 2.8];
  return (
    <svg
      viewBox={`${x1} ${y1} ${x2 - x1} ${y2 - y1}`}
      style={{ width: '100%', height: 'auto', display: 'block' }}
      role="img"
      aria-labelledby={`${id}title`}
      aria-describedby={`${id}desc`}
      focusable="false"
    >
      <title id={`${id}title`}>Where the workshops are</title>
      <desc id={`${id}desc`}>
        {`Drawn to scale, north up. ${marked.map(({ name }, index) => `${index + 1}: ${name}`).join('; ')}.`}
      </desc>
      {places.map(({ id: town, name, x, y }) => (
        <g key={town}>
          <circle
            cx={x}
            cy={y}
            r={town === from ? 0.34 : 0.2}
            fill={town === from ? 'var(--lf-colors-bracken)' : 'var(--lf-colors-slate)'}
          />
          <text
            x={x}
            y={y + 1.2}
            textAnchor="middle"
            fill={town === from ? 'var(--lf-colors-bracken)' : 'var(--lf-colors-slate)'}
            style={{ ...small, ...(town === from ? { fontWeight: 800 } : {}) }}
            {...ground}
          >
            {name}
          </text>
        </g>
      ))}
      {marked.map(({ id: workshop, x, y }, index) => (
        <g key={workshop}>
          <polygon
            points={hexagon(x, y - 0.3, 0.8)}
            fill={
              chosen === undefined || chosen === workshop ? 'var(--lf-colors-tarn)' : 'var(--lf-colors-paper)'
            }
            stroke="var(--lf-colors-tarn)"
            strokeWidth={0.1}
          />
          <text
            x={x}
            y={y + 0.1}
            textAnchor="middle"
            fill={
              chosen === undefined || chosen === workshop ? 'var(--lf-colors-paper)' : 'var(--lf-colors-tarn)'
            }
            style={{ ...small, fontWeight: 800 }}
          >
            {index + 1}
          </text>
        </g>
      ))}
      <g stroke="var(--lf-colors-slate)" strokeWidth={0.07} fill="none">
        <path d={`M${x2 - 6} ${y2 - 1.2}v0.4h5v-0.4`} />
      </g>
      <text x={x2 - 3.5} y={y2 - 1.15} textAnchor="middle" fill="var(--lf-colors-slate)" style={small}>
        5 km
      </text>
    </svg>
  );
}
