import type { CheckId } from '../answers.js';
import type { ShockFacts, ShockMount } from '../facts.js';
import type { Kept } from './kept.js';

/** Steps along the figures of a shock to where an answer is kept; the same figures always lead to the same place. */
export type Path = <T>(kept: Kept<T>, shock: ShockFacts) => Kept<T>;

/** What an answer changes with, besides the shock. */
export type Per = 'bike' | 'entry' | 'way';

function mountPath<T>(kept: Kept<T>, mount: ShockMount): Kept<T> {
  switch (mount.kind) {
    case 'eyelet':
      return kept.at('eyelet').at(mount.boreMm);
    case 'bearing-eye':
      return kept.at('bearing-eye').at(mount.boltMm).at(mount.widthMm);
    case 'trunnion':
      return kept.at('trunnion');
  }
}

const sizePath: Path = (kept, { sizeKey, spacedToKeys }) => {
  let place = kept.at(sizeKey);
  for (const key of spacedToKeys) place = place.at(key);
  return place;
};
const endsPath: Path = (kept, { bodyEnd, shaftEnd }) => mountPath(mountPath(kept, bodyEnd), shaftEnd);
const springPath: Path = (kept, { spring }) => kept.at(spring.kind);
/** The size of the shock matters to its spring only where no entry and no reading tells the size of the frame. */
const coilPath =
  (sized: boolean): Path =>
  (kept, { spring, sizeKey }) => {
    if (spring.kind === 'air') return kept;
    const place = kept.at(spring.springInsideMm).at(spring.maxFreeLengthMm).at(spring.collarPitchMm);
    return sized ? place : place.at(sizeKey);
  };
const limitPath: Path = (kept, { riderLimit }) =>
  riderLimit ? kept.at(riderLimit.value.kg).at(riderLimit.value.basis) : kept;
const diameterPath: Path = (kept, { spring, bodyEnd, diameterMm }) =>
  kept.at(spring.kind).at(bodyEnd.kind).at(diameterMm);
const remotePath: Path = (kept, { remote }) =>
  remote ? kept.at(remote.action).at(remote.line).at(remote.holdOpenPartId) : kept;
/** A recall, another notice or none: which notices they are changes the figures only. */
const noticesPath: Path = (kept, { notices }) => {
  let worst = '';
  for (const { effect } of notices) if (worst !== 'stop') worst = effect;
  return kept.at(worst);
};

interface Shelf {
  checks: readonly CheckId[];
  per: Per;
  path: Path;
}

/**
 * The cheap checks in the order in which they are shown, those of one path together: every fact of the shock that a
 * check reads (`factsRead`) is a step of its path. The pressure is not among them; it is shown after "spring-rate".
 */
export const shelvesFor = (sized: boolean): readonly Shelf[] => [
  { checks: ['eye-to-eye', 'stroke'], per: 'entry', path: sizePath },
  { checks: ['mounts', 'hardware'], per: 'way', path: endsPath },
  { checks: ['spring-type'], per: 'bike', path: springPath },
  { checks: ['coil-on-yoke'], per: 'entry', path: springPath },
  { checks: ['spring-rate'], per: 'entry', path: coilPath(sized) },
  { checks: ['rider-weight'], per: 'bike', path: limitPath },
  { checks: ['diameter'], per: 'bike', path: diameterPath },
  { checks: ['remote'], per: 'bike', path: remotePath },
  { checks: ['position'], per: 'way', path: (kept, { wayRound }) => kept.at(wayRound?.value ?? null) },
  {
    checks: ['e-bike'],
    per: 'bike',
    path: (kept, { eBikeApproved }) => kept.at(eBikeApproved?.value ?? null),
  },
  { checks: ['notices'], per: 'bike', path: noticesPath },
  { checks: ['reading-conflict'], per: 'bike', path: (kept) => kept },
];

/** The size by itself, on which the ride of a shock depends in one entry. */
export const keyPath: Path = (kept, { sizeKey }) => kept.at(sizeKey);
