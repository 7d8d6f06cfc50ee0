export interface Spot {
  x: number;
  y: number;
}

/** A bike's rear in one pose, mm; the main pivot is the origin, the wheel to the left, y downwards. */
export interface RearEndPose {
  axle: Spot;
  /** Where the swingarm holds the shock, and where the frame does. */
  lever: Spot;
  mount: Spot;
  /** Between the two, and what is lost of it. */
  shockMm: number;
  strokeMm: number;
}

export const travelMm = 140;
export const wheelRadiusMm = 370;
const armMm = 420;
/** The axle begins a little below the pivot and ends above it. */
const axleStartY = 60;
const leverStart: Spot = { x: 38, y: -166 };
const [extendedMm, compressedMm] = [210, 155];

const axleAt = (wheelMm: number): Spot => {
  const y = axleStartY - wheelMm;
  return { x: -Math.sqrt(armMm ** 2 - y ** 2), y };
};

function turned({ x, y }: Spot, radians: number): Spot {
  const [cos, sin] = [Math.cos(radians), Math.sin(radians)];
  return { x: x * cos - y * sin, y: x * sin + y * cos };
}

const directionOf = ({ x, y }: Spot): number => Math.atan2(y, x);
const full = 2 * Math.PI;

function leverAt(wheelMm: number): Spot {
  const swung = directionOf(axleAt(wheelMm)) - directionOf(axleAt(0));
  return turned(leverStart, ((((swung + Math.PI) % full) + full) % full) - Math.PI);
}

const distance = (a: Spot, b: Spot): number => Math.hypot(a.x - b.x, a.y - b.y);

/** In front of the lever, 210 mm from where it begins and 155 mm from where it ends: two circles that cross. */
function frameMount(): Spot {
  const [from, to] = [leverAt(0), leverAt(travelMm)];
  const apart = distance(from, to);
  const along = (extendedMm ** 2 - compressedMm ** 2 + apart ** 2) / (2 * apart);
  const aside = Math.sqrt(extendedMm ** 2 - along ** 2);
  const [ux, uy] = [(to.x - from.x) / apart, (to.y - from.y) / apart];
  return { x: from.x + along * ux - aside * uy, y: from.y + along * uy + aside * ux };
}

/**
 * An invented single pivot with 140 mm of travel on a 210 × 55 shock.
 * @param wheelMm how far the wheel has come up, 0 to 140
 */
export function rearEndPose(wheelMm: number): RearEndPose {
  const [lever, mount] = [leverAt(wheelMm), frameMount()];
  const shockMm = distance(lever, mount);
  return { axle: axleAt(wheelMm), lever, mount, shockMm, strokeMm: extendedMm - shockMm };
}
