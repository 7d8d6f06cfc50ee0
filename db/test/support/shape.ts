/** Key sets of the facts that are kept as JSON, as packages/fit-engine/src/facts.ts has them. */
export const keysOf = (thing: object): string[] => Object.keys(thing).sort();

export const frameFactKeys = [
  'cableRouting',
  'coilOnYoke',
  'eBike',
  'notices',
  'refusedPositions',
  'reservoirRoom',
  'reservoirStatement',
  'riderLimit',
  'room',
  'sagTargetPercent',
  'springStatement',
  'tunnelWidthMm',
  'wayRound',
];
export const entryKeys = [
  'chip',
  'curve',
  'frameEnd',
  'frameSizes',
  'id',
  'linkEnd',
  'modelYears',
  'sizeKey',
  'source',
  'travelMm',
];
export const endKeys = ['mount', 'source', 'thread', 'torqueNm', 'uncertaintyMm', 'yoke'];
export const shockFactKeys = [
  'bodyEnd',
  'diameterMm',
  'eBikeApproved',
  'massG',
  'notices',
  'remote',
  'reservoir',
  'riderLimit',
  'serviceHours',
  'shaftEnd',
  'source',
  'spacedToKeys',
  'spring',
  'tune',
  'wayRound',
];

/** Every source found anywhere in a thing, with the path to it. */
export function sourcesIn(thing: unknown, path = ''): { path: string; source: Record<string, unknown> }[] {
  if (typeof thing !== 'object' || thing === null) return [];
  return Object.entries(thing).flatMap(([key, value]) =>
    key === 'source'
      ? [{ path: `${path}/${key}`, source: value as Record<string, unknown> }]
      : sourcesIn(value, `${path}/${key}`),
  );
}
