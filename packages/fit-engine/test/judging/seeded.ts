/** Small seeded generator (mulberry32), so that every run draws the same questions. */
export interface Random {
  next(): number;
  chance(p: number): boolean;
  pick<T>(list: readonly T[]): T;
  between(from: number, to: number): number;
}

export function seeded(seed: number): Random {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  return {
    next,
    chance: (p) => next() < p,
    pick: (list) => {
      const found = list[Math.floor(next() * list.length)];
      if (found === undefined) throw new RangeError('nothing to pick from');
      return found;
    },
    between: (from, to) => from + next() * (to - from),
  };
}
