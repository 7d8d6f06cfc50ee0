export type Kind = 'pass' | 'work' | 'unknown' | 'fail';

/** A figure lies so near an edge that rounding would decide: thrown, so that the case is left out. */
export class TooClose extends Error {}
