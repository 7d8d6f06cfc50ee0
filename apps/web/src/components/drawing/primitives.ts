import { compose, n, point, type Shape } from './shapes';

type Style = Partial<Pick<Shape, 'width' | 'line' | 'fill'>>;

export function circle(part: string, cx: number, cy: number, r: number, style: Style = {}): Shape {
  const arc = `a${n(r)} ${n(r)} 0 1 0`;
  const d = `M${point(cx - r, cy)}${arc} ${point(2 * r, 0)}${arc} ${point(-2 * r, 0)}Z`;
  return compose(part, d, { x1: cx - r, y1: cy - r, x2: cx + r, y2: cy + r }, style);
}

export function line(part: string, x1: number, y1: number, x2: number, y2: number, style: Style = {}): Shape {
  const box = { x1: Math.min(x1, x2), y1: Math.min(y1, y2), x2: Math.max(x1, x2), y2: Math.max(y1, y2) };
  return compose(part, `M${point(x1, y1)}L${point(x2, y2)}`, box, {
    fill: 'none',
    width: 'narrow',
    ...style,
  });
}

/** A closed outline through the points, each corner rounded by up to `radius`. */
export function outline(
  part: string,
  points: readonly (readonly [number, number])[],
  radius = 1.5,
  style: Style = {},
): Shape {
  const count = points.length;
  const at = (index: number) => points[(index + count) % count] as readonly [number, number];
  const corners = points.map(([x, y], index) => {
    const [before, after] = [at(index - 1), at(index + 1)].map(([px, py]) => {
      const length = Math.hypot(px - x, py - y) || 1;
      const cut = Math.min(radius, length / 2);
      return point(x + ((px - x) * cut) / length, y + ((py - y) * cut) / length);
    });
    return `${index === 0 ? 'M' : 'L'}${before}Q${point(x, y)} ${after}`;
  });
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const box = { x1: Math.min(...xs), y1: Math.min(...ys), x2: Math.max(...xs), y2: Math.max(...ys) };
  return compose(part, `${corners.join('')}Z`, box, style);
}

/** A part turned on a lathe about the axis `cy`: its upper profile as (x, radius), mirrored. */
export function turned(
  part: string,
  profile: readonly (readonly [number, number])[],
  { cy = 0, radius = 1.5, ...style }: Style & { cy?: number; radius?: number } = {},
): Shape {
  const upper = profile.map(([x, r]) => [x, cy - r] as const);
  const lower = profile.map(([x, r]) => [x, cy + r] as const).reverse();
  return outline(part, [...upper, ...lower], radius, style);
}

export const rectangle = (
  part: string,
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  radius = 0.6,
  style: Style = {},
) =>
  outline(
    part,
    [
      [x1, y1],
      [x2, y1],
      [x2, y2],
      [x1, y2],
    ],
    radius,
    style,
  );

/** A round bar seen from the side: a band of the given diameter with round ends. */
export function capsule(
  part: string,
  [x1, y1]: readonly [number, number],
  [x2, y2]: readonly [number, number],
  diameter: number,
  style: Style = {},
): Shape {
  const r = diameter / 2;
  const length = Math.hypot(x2 - x1, y2 - y1) || 1;
  const [ox, oy] = [(-(y2 - y1) / length) * r, ((x2 - x1) / length) * r];
  const arc = `A${n(r)} ${n(r)} 0 0 1`;
  const d =
    `M${point(x1 + ox, y1 + oy)}${arc} ${point(x1 - ox, y1 - oy)}` +
    `L${point(x2 - ox, y2 - oy)}${arc} ${point(x2 + ox, y2 + oy)}Z`;
  const box = {
    x1: Math.min(x1, x2) - r,
    y1: Math.min(y1, y2) - r,
    x2: Math.max(x1, x2) + r,
    y2: Math.max(y1, y2) + r,
  };
  return compose(part, d, box, style);
}
