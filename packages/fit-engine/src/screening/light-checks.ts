import type { CheckId } from '../answers.js';
import type { FitQuestion, SheetEntry, ShockFacts } from '../facts.js';
import type { Shared, Trial } from '../rules/context.js';
import { pressureCode, pressureKind, type PressureCode } from '../rules/pressure.js';
import { rideOf, type RideResult } from '../rules/ride.js';
import { checks, ways } from '../rules/run-trial.js';
import { sizeChecks } from '../rules/size.js';
import { Facets } from './facets.js';
import { costOf, failCost, lightOf, type Light } from './light.js';
import { keyPath, shelvesFor, type Per } from './shelves.js';

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

/** The shelves where each entry tells its size and where one does not, with the facets of all shocks seen so far. */
const [unsized, sized] = [false, true].map((known) => {
  const shelves = shelvesFor(known);
  return {
    shelves,
    facets: new Facets([...shelves.map(({ path }) => path), keyPath]),
    // After this one of the shelves the pressure is shown.
    beforePressure: shelves.findIndex(({ checks: ids }) => ids.includes('spring-rate')),
  };
}) as [House, House];

interface House {
  shelves: ReturnType<typeof shelvesFor>;
  facets: Facets;
  beforePressure: number;
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
  private readonly house: House;
  /** By shelf, then by facet. */
  private readonly kept: ByPlace[][];
  /** By shelf, then by facet: whether every place fails. */
  private readonly dead: boolean[][];
  private readonly rides: (readonly RideResult[])[] = [];

  constructor(
    private readonly base: Omit<FitQuestion, 'shock'>,
    private readonly shared: Shared,
    private readonly entries: readonly SheetEntry[],
  ) {
    this.places = entries.length * ways.length;
    this.house = entries.every(({ sizeKey }) => sizeKey !== null) ? sized : unsized;
    this.kept = this.house.shelves.map(() => []);
    this.dead = this.house.shelves.map(() => []);
    this.beforePressure = this.house.beforePressure;
  }

  trialAt(shock: ShockFacts, place: number): Trial {
    const entry = this.entries[Math.floor(place / ways.length)] as SheetEntry;
    const wayRound = ways[place % ways.length] as Trial['wayRound'];
    const { frame, present, rider, sale } = this.base;
    return { frame, present, rider, sale, shock, shared: this.shared, entry, wayRound, full: false };
  }

  /** Whether one shelf by itself refuses the shock in every entry and either way round: most are, by their size. */
  refusedByOne(shock: ShockFacts): boolean {
    const { facets, shelves } = this.house;
    const numbers = facets.of(shock);
    for (let i = 0; i < shelves.length; i += 1) {
      const number = numbers[i] as number;
      const dead = this.dead[i] as boolean[];
      const known = (dead[number] ??= this.lights(shock, i, number).every(({ cost }) => cost >= failCost));
      if (known) return true;
    }
    return false;
  }

  /** Puts the lights of every shelf, in the order in which checks are shown, into `row`. */
  fill(shock: ShockFacts, row: ByPlace[]): void {
    const { facets, shelves } = this.house;
    const numbers = facets.of(shock);
    for (let i = 0; i < shelves.length; i += 1) {
      row[i] = this.lights(shock, i, numbers[i] as number);
    }
  }

  private lights(shock: ShockFacts, shelf: number, facet: number): ByPlace {
    const kept = this.kept[shelf] as ByPlace[];
    const found = kept[facet];
    if (found) return found;
    const { per, checks: ids } = this.house.shelves[shelf] as House['shelves'][number];
    return (kept[facet] = this.ask(shock, per, ids));
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
    const number = this.house.facets.of(shock).at(-1) as number;
    const rides = (this.rides[number] ??= this.entries.map((_, i) =>
      rideOf(this.trialAt(shock, i * ways.length)),
    ));
    const found = rides[entry] as RideResult;
    if ('ride' in found) return pressureLight(pressureCode(shock, spring, found.ride));
    return together([lightOf(checks.pressure(this.trialAt(shock, entry * ways.length)))]);
  }
}
