import { useId, type CSSProperties } from 'react';
import { formatFigure } from '../../lib/format-figure';
import { axisFor, spread } from './scale';

export type Who = 'next' | 'present';
export interface Line {
  who: Who;
  /** Stands at the line's end. */
  label: string;
  points: readonly (readonly [number, number])[];
  /** Where the rider sits, on the x axis; marked on the line. */
  sag: readonly [number, number] | null;
}
export interface LineChartProps {
  title: string;
  /** The same in words. */
  description: string;
  /** Quantity and unit of the y axis. */
  yLabel: string;
  lines: readonly Line[];
  /** Otherwise the axis begins near the least value, for what varies little. */
  fromZero?: boolean;
  /** A level that is drawn across, with its word. */
  level?: { at: number; label: string } | null;
  decimals?: number;
}

const [width, height, left, right, top, bottom] = [400, 272, 46, 62, 30, 44];
const small: CSSProperties = { fontSize: '13px', fontWeight: 600, fontVariantNumeric: 'tabular-nums' };
const slate = 'var(--lf-colors-slate)';
/** The new one in bracken and full, the present one in tarn and dashed: told apart without colour too. */
const looks: Record<Who, { colour: string; dash: string | undefined }> = {
  next: { colour: 'var(--lf-colors-bracken)', dash: undefined },
  present: { colour: 'var(--lf-colors-tarn)', dash: '7 4' },
};

/** Curves over the wheel's travel with labels at their ends; what it says stands in words and in a table beside it. */
export function LineChart(props: LineChartProps) {
  const { title, description, yLabel, lines, fromZero = true, level = null, decimals = 0 } = props;
  const id = useId();
  const all = lines.flatMap(({ points }) => points);
  const yAxis = axisFor([...all.map(([, value]) => value), ...(level ? [level.at] : [])], fromZero);
  const xAxis = axisFor(
    all.map(([mm]) => mm),
    true,
    5,
  );
  const end = Math.max(...all.map(([mm]) => mm));
  const x = (mm: number): number => left + (mm / end) * (width - left - right);
  const y = (value: number): number =>
    height - bottom - ((value - yAxis.from) / (yAxis.to - yAxis.from)) * (height - bottom - top);
  const at = ([mm, value]: readonly [number, number]): string => `${x(mm).toFixed(2)} ${y(value).toFixed(2)}`;
  const ends = lines.map(({ points }) => points.at(-1) ?? [0, 0]);
  const labelY = spread(
    ends.map(([, value]) => y(value)),
    16,
  );
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      style={{ width: 'min(100%, 600px)', height: 'auto' }}
      role="img"
      aria-labelledby={`${id}title`}
      aria-describedby={`${id}desc`}
      focusable="false"
    >
      <title id={`${id}title`}>{title}</title>
      <desc id={`${id}desc`}>{description}</desc>
      {yAxis.ticks.map((tick) => (
        <g key={tick}>
          <line
            x1={left}
            x2={x(end)}
            y1={y(tick)}
            y2={y(tick)}
            stroke={tick === yAxis.ticks[0] ? slate : 'var(--lf-colors-hair)'}
            strokeWidth={1}
          />
          <text x={left - 7} y={y(tick) + 4.5} textAnchor="end" fill={slate} style={small}>
            {formatFigure(tick, 2)}
          </text>
        </g>
      ))}
      {xAxis.ticks
        .filter((tick) => tick <= end)
        .map((tick) => (
          <g key={tick}>
            <line
              x1={x(tick)}
              x2={x(tick)}
              y1={height - bottom}
              y2={height - bottom + 5}
              stroke={slate}
              strokeWidth={1}
            />
            <text x={x(tick)} y={height - bottom + 19} textAnchor="middle" fill={slate} style={small}>
              {tick}
            </text>
          </g>
        ))}
      <text x={0} y={13} fill={slate} style={small}>
        {yLabel}
      </text>
      <text x={x(end)} y={height - 6} textAnchor="end" fill={slate} style={small}>
        Wheel travel, mm
      </text>
      {level ? (
        <g>
          <line
            data-level=""
            x1={left}
            x2={x(end)}
            y1={y(level.at)}
            y2={y(level.at)}
            stroke={slate}
            strokeWidth={1}
            strokeDasharray="13 3 2 3"
          />
          <text x={x(end)} y={y(level.at) + 16} textAnchor="end" fill={slate} style={small}>
            {level.label}
          </text>
        </g>
      ) : null}
      {lines.map(({ who, label, points, sag }, index) => (
        <g key={who} data-series={who}>
          <path
            d={points.map((point, i) => `${i === 0 ? 'M' : 'L'}${at(point)}`).join('')}
            fill="none"
            stroke={looks[who].colour}
            strokeWidth={2.2}
            strokeLinejoin="round"
            strokeDasharray={looks[who].dash}
          />
          {sag ? (
            <circle
              data-sag=""
              cx={x(sag[0])}
              cy={y(sag[1])}
              r={4.5}
              fill="var(--lf-colors-paper)"
              stroke={looks[who].colour}
              strokeWidth={2.2}
            >
              <title>{`Sag: ${formatFigure(sag[0], 0)} mm, ${formatFigure(sag[1], decimals)}`}</title>
            </circle>
          ) : null}
          <text
            x={x(ends[index]?.[0] ?? 0) + 7}
            y={(labelY[index] ?? 0) + 4.5}
            fill={looks[who].colour}
            style={{ ...small, fontSize: '14px', fontWeight: 800 }}
          >
            {label}
          </text>
        </g>
      ))}
    </svg>
  );
}
