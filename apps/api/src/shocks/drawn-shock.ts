import type { DrawnShock } from '@linkfell/contracts';
import { sizeOf, type ShockFacts } from '@linkfell/fit-engine';

/** What the drawing shows of a shock on sale. */
export function drawnShock(shock: ShockFacts, positionDeg: number | null): DrawnShock {
  const size = sizeOf(shock.sizeKey);
  const { reservoir } = shock;
  return {
    eyeToEyeMm: size?.eyeToEyeMm ?? Number(shock.sizeKey.split('x')[0]),
    strokeMm: size?.strokeMm ?? null,
    bodyEnd: shock.bodyEnd,
    shaftEnd: shock.shaftEnd,
    spring: shock.spring.kind,
    diameterMm: shock.diameterMm,
    reservoir: reservoir && {
      lengthMm: reservoir.lengthMm,
      diameterMm: reservoir.diameterMm,
      positionDeg: positionDeg ?? reservoir.positionsDeg[0] ?? 0,
    },
    remote: shock.remote !== null,
  };
}
