import type { CheckId } from '../answers.js';
import type { FitQuestion, SheetEntry, ShockFacts } from '../facts.js';
import type { Shared, Trial } from '../rules/context.js';
import { pressureCode, pressureKind, type PressureCode } from '../rules/pressure.js';
import { rideOf, type RideResult } from '../rules/ride.js';
import { checks, ways } from '../rules/run-trial.js';
import { sizeChecks } from '../rules/size.js';
import { Kept } from './kept.js';
import { costOf, lightOf, type Light } from './light.js';
import { shelvesFor, type Per } from './shelves.js';

/** What checks of one shelf say of a shock in one entry, one way round, with the sum of their costs. */
export interface Lights {
  lights: readonly Light[];
  cost: number;
}
/** By entry, and for each entry by way round. */
export type ByPlace = readonly Lights[];

const together = (lights: readonly Light[]): Lights => ({
  lights,
  cost: lights.reduce((sum, { cost }) => sum + cost, 0),
});
const nothing = together([]);

const pressureLights = new Map<PressureCode, Lights>();
function pressureLight(code: PressureCode): Lights {
  const before = pressureLights.get(code);
  if (before) return before;
  const made = together([
    { check: 'pressure', code, cost: costOf({ answer: pressureKind(code), parts: [] }) },
  ]);
  pressureLights.set(code, made);
  return made;
}

/** Eye-to-eye and stroke come of one comparison. */
const read = (ids: readonly CheckId[], trial: Trial): Light[] =>
  ids[0] === 'eye-to-eye' ? sizeChecks(trial).map(lightOf) : ids.map((id) => lightOf(checks[id](trial)));

/**
 * The cheap checks of many shocks against one bike, without their figures. What is not yet kept is asked of the check
 * itself, so that no rule is written twice. Only the pressure has too many figures to be kept; it is reckoned anew.
 */
export class LightChecks {
  /** Entry 0 both ways round, entry 1 both ways round, and so on. */
  readonly places: number;
  /** After this one of the shelves the pressure is shown. */
  readonly beforePressure: number;
  private readonly kept;
  private readonly rides = new Kept<readonly RideResult[]>();

  constructor(
    private readonly base: Omit<FitQuestion, 'shock'>,
    private readonly shared: Shared,
    private readonly entries: readonly SheetEntry[],
  ) {
    this.places = entries.length * ways.length;
    this.kept = shelvesFor(entries).map((shelf) => ({ ...shelf, all: new Kept<ByPlace>() }));
    this.beforePressure = this.kept.findIndex(({ checks: ids }) => ids.includes('spring-rate'));
  }

  trialAt(shock: ShockFacts, place: number): Trial {
    const entry = this.entries[Math.floor(place / ways.length)] as SheetEntry;
    const wayRound = ways[place % ways.length] as Trial['wayRound'];
    const { frame, present, rider, sale } = this.base;
    return { frame, present, rider, sale, shock, shared: this.shared, entry, wayRound, full: false };
  }

  /** Puts the lights of every shelf, in the order in which checks are shown, into `row`. */
  fill(shock: ShockFacts, row: ByPlace[]): void {
    for (let i = 0; i < this.kept.length; i += 1) {
      const { all, path, per, checks: ids } = this.kept[i] as (typeof this.kept)[number];
      const kept = path(all, shock);
      row[i] = kept.value ??= this.ask(shock, per, ids);
    }
  }

  private ask(shock: ShockFacts, per: Per, ids: readonly CheckId[]): ByPlace {
    let last = nothing;
    return Array.from({ length: this.places }, (_, place) => {
      const anew = per === 'way' || place === 0 || (per === 'entry' && place % ways.length === 0);
      if (anew) last = together(read(ids, this.trialAt(shock, place)));
      return last;
    });
  }

  /** The pressure of an air shock in one entry; of a coil shock nothing. */
  pressure(shock: ShockFacts, entry: number): Lights {
    const { spring } = shock;
    if (spring.kind !== 'air') return nothing;
    const kept = this.rides.at(shock.sizeKey);
    kept.value ??= this.entries.map((_, i) => rideOf(this.trialAt(shock, i * ways.length)));
    const found = kept.value[entry] as RideResult;
    if ('ride' in found) return pressureLight(pressureCode(shock, spring, found.ride));
    return together([lightOf(checks.pressure(this.trialAt(shock, entry * ways.length)))]);
  }
}
