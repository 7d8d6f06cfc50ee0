import { chakra } from '@chakra-ui/react';

/** Room for the longest size there is, 267 mm, and its eye. */
const longest = 275;
const margin = 10;
const marks = [0, 50, 100, 150, 200, 250];
const wide = { strokeWidth: 1.4, vectorEffect: 'non-scaling-stroke' } as const;
const thin = { strokeWidth: 0.7, vectorEffect: 'non-scaling-stroke' } as const;
const Svg = chakra('svg', { base: { display: 'block', width: 'full', height: 'auto', overflow: 'visible' } });

const Marks = ({ from, to }: { from: number; to: number }) =>
  marks.map((mm) => (
    <line
      key={mm}
      x1={mm}
      x2={mm}
      y1={from}
      y2={to}
      stroke="var(--lf-colors-hair)"
      strokeWidth={1}
      vectorEffect="non-scaling-stroke"
    />
  ));

const Eye = ({ x }: { x: number }) => (
  <>
    <circle cx={x} cy={0} r={4.8} {...wide} />
    <circle cx={x} cy={0} r={2.6} {...wide} />
  </>
);

export interface SizeBarProps {
  eyeToEyeMm: number;
  strokeMm: number;
  trunnion: boolean;
}

/**
 * A size on the one millimetre scale of its list: from axis to axis, the part that it shortens by in bracken. The
 * figures stand beside it as text.
 */
export function SizeBar({ eyeToEyeMm, strokeMm, trunnion }: SizeBarProps) {
  const head = eyeToEyeMm - 12;
  const can = head - strokeMm;
  return (
    <Svg
      viewBox={`${-margin} -9 ${longest + 2 * margin} 18`}
      data-mm={eyeToEyeMm}
      data-stroke-mm={strokeMm}
      aria-hidden="true"
      focusable="false"
    >
      <Marks from={-9} to={9} />
      <g stroke="var(--lf-colors-ink)" fill="var(--lf-colors-paper)" strokeLinejoin="round">
        {trunnion ? (
          <>
            <rect x={-5} y={-5} width={25} height={10} rx={1.5} {...wide} />
            <circle cx={0} cy={0} r={2} {...wide} />
          </>
        ) : (
          <>
            <path d="M3 -1.6H15L20 -4V4L15 1.600H3Z" {...wide} />
            <Eye x={0} />
          </>
        )}
        <path d={`M20 -5.5H${can - 4}L${can} -3.500V3.500L${can - 4} 5.500H20Z`} {...wide} />
        <line x1={can - 8} x2={can - 8} y1={-5.5} y2={5.5} {...thin} />
        <line x1={26} x2={26} y1={-5.5} y2={5.5} {...thin} />
        <rect x={head} y={-3} width={8} height={6} rx={1} {...wide} />
        <Eye x={eyeToEyeMm} />
      </g>
      <line
        x1={can}
        x2={head}
        y1={0}
        y2={0}
        stroke="var(--lf-colors-bracken)"
        strokeWidth={4}
        vectorEffect="non-scaling-stroke"
      />
    </Svg>
  );
}

/** The scale above a list of bars, in millimetres. */
export function SizeScale() {
  return (
    <chakra.div aria-hidden="true" fontSize="sm" color="slate">
      <chakra.div position="relative" height="1.25rem">
        {marks.map((mm) => (
          <chakra.span
            key={mm}
            position="absolute"
            transform="translateX(-50%)"
            style={{ left: `${((mm + margin) / (longest + 2 * margin)) * 100}%` }}
          >
            {mm}
          </chakra.span>
        ))}
      </chakra.div>
      <Svg viewBox={`${-margin} -4 ${longest + 2 * margin} 4`} focusable="false">
        <Marks from={-4} to={0} />
      </Svg>
    </chakra.div>
  );
}
