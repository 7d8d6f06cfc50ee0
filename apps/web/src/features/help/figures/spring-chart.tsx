import { useId, type CSSProperties } from 'react';
import { airForceN, coilForceN, sagMm, samples, strokeMm } from './spring-curves';

const [width, height, left, bottom] = [340, 204, 46, 24];
const topN = 8000;
const x = (mm: number): number => left + (mm / strokeMm) * (width - left - 44);
const y = (newton: number): number => height - bottom - (newton / topN) * (height - bottom - 24);
const path = (force: (mm: number) => number): string =>
  samples(force)
    .map(([mm, newton], index) => `${index === 0 ? 'M' : 'L'}${x(mm).toFixed(1)} ${y(newton).toFixed(1)}`)
    .join('');
const small: CSSProperties = { fontSize: '12px', fontWeight: 600, fontVariantNumeric: 'tabular-nums' };
const slate = 'var(--lf-colors-slate)';
const ends = [
  { name: 'Air', force: airForceN, colour: 'var(--lf-colors-tarn)', dash: undefined },
  { name: 'Coil', force: coilForceN, colour: 'var(--lf-colors-bracken)', dash: '7 4' },
] as const;

/** Force against stroke for an air spring and a coil that carry the same rider at the same sag. */
export function SpringChart() {
  const id = useId();
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      style={{ width: 'min(100%, 560px)', height: 'auto' }}
      role="img"
      aria-labelledby={`${id}title`}
      aria-describedby={`${id}desc`}
    >
      <title id={`${id}title`}>Force against stroke, air and coil</title>
      <desc id={`${id}desc`}>
        {`Both carry the same load at ${sagMm} mm. At full stroke the air spring pushes with ${Math.round(airForceN(strokeMm))} N and rises steeply, the coil with ${Math.round(coilForceN(strokeMm))} N in a straight line.`}
      </desc>
      {[0, 2000, 4000, 6000, 8000].map((newton) => (
        <g key={newton}>
          <line
            x1={left}
            x2={x(strokeMm)}
            y1={y(newton)}
            y2={y(newton)}
            stroke="var(--lf-colors-hair)"
            strokeWidth={1}
          />
          <text x={left - 6} y={y(newton) + 4} textAnchor="end" fill={slate} style={small}>
            {newton}
          </text>
        </g>
      ))}
      <text x={0} y={11} fill={slate} style={small}>
        Force, N, against stroke, mm
      </text>
      {[0, 11, 22, 33, 44, 55].map((mm) => (
        <text key={mm} x={x(mm)} y={height - bottom + 16} textAnchor="middle" fill={slate} style={small}>
          {mm}
        </text>
      ))}
      <text x={x(strokeMm) + 12} y={height - bottom + 16} fill={slate} style={small}>
        mm
      </text>
      <line
        x1={x(sagMm)}
        x2={x(sagMm)}
        y1={y(0)}
        y2={y(topN)}
        stroke={slate}
        strokeWidth={1}
        strokeDasharray="13 3 2 3"
      />
      <text x={x(sagMm) + 5} y={y(topN) + 14} fill={slate} style={small}>
        sag {sagMm}
      </text>
      {ends.map(({ name, force, colour, dash }) => (
        <g key={name}>
          <path d={path(force)} fill="none" stroke={colour} strokeWidth={2.4} strokeDasharray={dash} />
          <text
            x={x(strokeMm) + 5}
            y={y(force(strokeMm)) + 4}
            fill={colour}
            style={{ ...small, fontSize: '13px', fontWeight: 800 }}
          >
            {name}
          </text>
        </g>
      ))}
    </svg>
  );
}
