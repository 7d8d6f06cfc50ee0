import type { ShockFacts } from '../facts.js';
import { Kept } from './kept.js';
import type { Path } from './shelves.js';

/**
 * Numbers the places to which a path leads, and remembers for each shock to which it leads. The numbers hold for all
 * bikes: a catalogue that is gone through again, for another bike, is not walked along its figures again. Shocks are
 * remembered by identity, so their facts must not be changed in place (they are read-only).
 */
export class Facets {
  private readonly numbers: Kept<number>[];
  private readonly known = new WeakMap<ShockFacts, Int32Array>();
  private readonly used: number[];

  constructor(private readonly paths: readonly Path[]) {
    this.numbers = paths.map(() => new Kept<number>());
    this.used = paths.map(() => 0);
  }

  /** One number per path, in the order of the paths. */
  of(shock: ShockFacts): Int32Array {
    const before = this.known.get(shock);
    if (before) return before;
    const made = new Int32Array(this.paths.length);
    for (let i = 0; i < this.paths.length; i += 1) {
      const place = (this.paths[i] as Path)(this.numbers[i] as Kept<number>, shock);
      if (place.value === null) {
        place.value = this.used[i] as number;
        this.used[i] = place.value + 1;
      }
      made[i] = place.value;
    }
    this.known.set(shock, made);
    return made;
  }
}
