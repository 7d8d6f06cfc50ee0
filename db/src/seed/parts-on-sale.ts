import type { PartsOnSale } from '@linkfell/fit-engine';

import type { Scenario } from './scenario.js';

/** 1 lb/in in N/mm, from the exact pound, inch and standard gravity. */
const nPerMmPerLbPerIn = (0.45359237 * 9.80665) / 25.4;

/** The parts of the scenario that some shop has on its shelf, as the engine is told them. */
export function partsOnSale(s: Scenario): PartsOnSale {
  const stocked = new Set(s.listings.filter(({ quantity }) => quantity > 0).map(({ itemId }) => itemId));
  const onSale = <T extends { id: string }>(items: readonly T[]): T[] =>
    items.filter(({ id }) => stocked.has(id));
  return {
    kits: onSale(s.kits),
    coils: onSale(s.coils).map((coil) => ({ ...coil, rateNPerMm: coil.rateLbPerIn * nPerMmPerLbPerIn })),
    remotes: onSale(s.remotes),
    otherPartIds: onSale(s.holdOpenParts).map(({ id }) => id),
  };
}
