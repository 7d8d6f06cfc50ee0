import type { ShockLayout } from '../layout';
import { capsule, line, turned } from '../primitives';
import type { Shape } from '../shapes';

export interface CoilShapes {
  /** The half of each turn behind the damper. */
  back: Shape[];
  /** The half in front, with collar and perch. */
  front: Shape[];
}

function knurl(part: string, x1: number, x2: number, r: number): Shape[] {
  return [-0.8, -0.55, -0.25, 0.25, 0.55, 0.8].map((at) => line(part, x1, at * r, x2, at * r));
}

/** A coil between its collar and its perch, compressed with the shock; the wire keeps its thickness. */
export function coilShapes(layout: ShockLayout, compressedMm: number): CoilShapes {
  if (!layout.coil) return { back: [], front: [] };
  const { outerR, wire, collarX, turns } = layout.coil;
  const perchX = layout.coil.perchX - compressedMm;
  const meanR = outerR - wire / 2;
  const from = collarX + wire / 2;
  const span = perchX - collarX - wire;
  const at = (turn: number): number => from + (span * turn) / turns;
  const back: Shape[] = [];
  const front: Shape[] = [];
  for (let turn = 0; turn < turns; turn += 1) {
    front.push(capsule('coil', [at(turn), meanR], [at(turn + 0.5), -meanR], wire));
    back.push(capsule('coil', [at(turn + 0.5), -meanR], [at(turn + 1), meanR], wire, { width: 'narrow' }));
  }
  front.push(capsule('coil', [at(turns), meanR], [at(turns), meanR * 0.4], wire));
  const collar = turned('collar', [
    [collarX - 9, outerR * 0.8],
    [collarX - 4, outerR + 1],
    [collarX, outerR + 1],
  ]);
  const perch = turned('perch', [
    [perchX, outerR + 1],
    [perchX + 4, outerR + 1],
    [perchX + 6, outerR * 0.7],
  ]);
  return {
    back,
    front: [...front, collar, ...knurl('collar', collarX - 4, collarX, outerR), perch],
  };
}
