import type { FrameFacts, PresentShock, Reading } from '../../src/facts.js';

/** Label, family and true dimensions, written out again from the trade's tables. */
type Row = [label: string, family: 'eyelet' | 'trunnion', eye: number, stroke: number];
const eyelets = {
  190: [37.5, 40, 42.5, 45],
  210: [47.5, 50, 52.5, 55],
  230: [57.5, 60, 62.5, 65],
  250: [67.5, 70, 72.5, 75],
};
const trunnions = { 165: eyelets[190], 185: eyelets[210], 205: eyelets[230], 225: eyelets[250] };
const inches: [string, number, number][] = [
  ['165x38', 6.5, 1.5],
  ['184x44', 7.25, 1.75],
  ['190x50', 7.5, 2],
  ['197x48', 7.75, 1.9],
  ['200x50', 7.875, 2],
  ['200x57', 7.875, 2.25],
  ['216x63', 8.5, 2.5],
  ['222x66', 8.75, 2.6],
  ['222x70', 8.75, 2.75],
  ['240x76', 9.5, 3],
  ['267x89', 10.5, 3.5],
];
const metric = (family: Row[1], table: Record<string, number[]>): Row[] =>
  Object.entries(table).flatMap(([eye, strokes]) =>
    strokes.map((stroke): Row => [`${eye}x${stroke}`, family, Number(eye), stroke]),
  );
export const rows: Row[] = [
  ...metric('eyelet', eyelets),
  ...metric('trunnion', trunnions),
  ...inches.map(([label, eye, stroke]): Row => [label, 'eyelet', eye * 25.4, stroke * 25.4]),
];
const alsoCalled: Record<string, string> = { '190x51': '190x50', '200x51': '200x50', '241x76': '240x76' };
export const rowOf = (label: string): Row | undefined =>
  rows.find(([name]) => name === (alsoCalled[label] ?? label));

const u = ({ tool, awkward }: Reading): number => {
  const plain = { print: 0.5, caliper: 0.25, ruler: 0.7, tape: 1.2 }[tool];
  return awkward ? Math.sqrt(plain * plain + 0.25) : plain;
};
const bell = (x: number, s: number): number => Math.exp((-x * x) / (2 * s * s)) / s;

/** Likelihood times prior in plain arithmetic, midpoint rule over what keeps the shock from closing. */
function weight(p: PresentShock, [, , e, s]: Row, limit: number): number {
  let sum = 0;
  const n = 150;
  for (let i = 0; i < n; i += 1) {
    const b = ((i + 0.5) / n) * limit;
    sum +=
      (p.compressed ? bell(p.compressed.mm - (e - s + b), u(p.compressed)) : 1) *
      (p.shaftTravel ? bell(p.shaftTravel.mm - (s - b), u(p.shaftTravel)) : 1);
  }
  return (p.eyeToEye ? bell(p.eyeToEye.mm - e, u(p.eyeToEye)) : 1) * (sum / n);
}

/** Furthest reading in uncertainties, at the B between 0 and 2 mm that suits the closed readings best. */
function furthest(p: PresentShock, [, , e, s]: Row): number {
  const closed: [number, number][] = [];
  if (p.compressed) closed.push([p.compressed.mm - e + s, u(p.compressed)]);
  if (p.shaftTravel) closed.push([s - p.shaftTravel.mm, u(p.shaftTravel)]);
  let best = { cost: Infinity, b: 0 };
  for (let b = 0; b <= 2.0000001; b += 0.002) {
    const cost = closed.reduce((sum, [x, sd]) => sum + ((x - b) / sd) ** 2, 0);
    if (cost < best.cost) best = { cost, b };
  }
  const far = closed.map(([x, sd]) => Math.abs(x - best.b) / sd);
  if (p.eyeToEye) far.push(Math.abs(p.eyeToEye.mm - e) / u(p.eyeToEye));
  return Math.max(0, ...far);
}

function family(frame: FrameFacts, p: PresentShock): Row[1] | null {
  if (p.bodyEndKind === 'trunnion' || p.shaftEndKind === 'trunnion') return 'trunnion';
  if (p.bodyEndKind && p.shaftEndKind) return 'eyelet';
  const ends = frame.entries.flatMap((entry) => [entry.frameEnd, entry.linkEnd]);
  if (ends.some((end) => end?.mount.kind === 'trunnion')) return 'trunnion';
  return ends.every((end) => end) ? 'eyelet' : null;
}

/** The settled size of the present shock, null where it is not settled, "close" where rounding could decide. */
export function settled(frame: FrameFacts, p: PresentShock): string | null | 'close' {
  const before = known.get(p);
  if (before !== undefined) return before;
  const found = settle(frame, p);
  known.set(p, found);
  return found;
}
const known = new WeakMap<PresentShock, string | null>();

function settle(frame: FrameFacts, p: PresentShock): string | null | 'close' {
  const kind = family(frame, p);
  const possible = rows.filter((row) => kind === null || row[1] === kind);
  const printed = p.printedSizeKey === null ? undefined : rowOf(p.printedSizeKey);
  if (printed) {
    const far = furthest(p, printed);
    if (Math.abs(far - 3) < 0.01) return 'close';
    return possible.includes(printed) && far <= 3 ? printed[0] : null;
  }
  if (!p.eyeToEye && !p.compressed && !p.shaftTravel) return null;
  const published = frame.entries.map((entry) => entry.sizeKey);
  const listed = possible.filter(([label]) => published.includes(label)).length;
  const prior = ([label]: Row): number => {
    if (listed === 0) return 1;
    if (published.includes(label)) return (listed === possible.length ? 1 : 0.9) / listed;
    return 0.1 / (possible.length - listed);
  };
  const shares = [1, 2, 3].map((limit) => {
    const weights = possible.map((row) => prior(row) * weight(p, row, limit));
    const total = weights.reduce((a, b) => a + b, 0);
    return weights.map((w) => (total > 0 ? w / total : 0));
  });
  const least = possible.map((_, i) => Math.min(...shares.map((share) => share[i] ?? 0)));
  const top = Math.max(...least);
  const winner = possible[least.indexOf(top)];
  if (Math.abs(top - 0.95) < 0.002) return 'close';
  if (top < 0.95 || !winner) return null;
  const far = furthest(p, winner);
  if (Math.abs(far - 4) < 0.01) return 'close';
  return far > 4 ? null : winner[0];
}
