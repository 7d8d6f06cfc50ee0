import type { Refusal } from '../answers.js';
import type { FitQuestion, SheetEntry, ShockFacts } from '../facts.js';
import type { Shared } from '../rules/context.js';
import { reservoirCheck, type ReservoirAnswer } from '../rules/reservoir.js';
import { outcomeOf, type Outcome, ways } from '../rules/run-trial.js';
import { LightChecks, type ByPlace, type Lights } from './light-checks.js';
import { costOf, failCost, type Light } from './light.js';

/**
 * Many shocks against one bike. Of each shock only the codes are looked at first, so that one that is refused costs
 * some look-ups and no figures. Entry and way round are chosen just as `judge` chooses them; tests hold the two
 * against each other.
 */
export class Screen {
  private readonly checks: LightChecks;
  /** Places in the order that decides between equals. */
  private readonly order: readonly number[];
  // What the present shock comes to; written over by the next one.
  private readonly row: ByPlace[] = [];
  private readonly pressures: Lights[] = [];
  private readonly costs: number[] = [];

  constructor(
    base: Omit<FitQuestion, 'shock'>,
    shared: Shared,
    private readonly entries: readonly SheetEntry[],
  ) {
    this.checks = new LightChecks(base, shared, entries);
    const id = (place: number): string => entries[Math.floor(place / ways.length)]?.id ?? '';
    const compare = (a: number, b: number): number =>
      id(a) === id(b) ? (a % ways.length) - (b % ways.length) : id(a) < id(b) ? -1 : 1;
    this.order = Array.from({ length: this.checks.places }, (_, place) => place).sort(compare);
  }

  /** Whether a cheap check refuses a shock in every way, without saying which. */
  refuses(shock: ShockFacts): boolean {
    return this.checks.refusedByOne(shock) || (this.costs[this.cheapest(shock)] as number) >= failCost;
  }

  /** The refusal of a shock that a cheap check refuses in every way; null for one that may fit. */
  refusal(shock: ShockFacts): Refusal | null {
    const place = this.cheapest(shock);
    if ((this.costs[place] as number) < failCost) return null;
    const { check, code } = this.firstFail(place);
    const entryId = this.entries[Math.floor(place / ways.length)]?.id ?? '';
    return { verdict: 'wont-fit', check, code, entryId, wayRound: ways[place % ways.length] ?? ways[0] };
  }

  /** The best way of putting a shock in, all its answers told; reservoirs are swept where nothing cheap refuses. */
  outcome(shock: ShockFacts): Outcome {
    const cheapest = this.cheapest(shock);
    if ((this.costs[cheapest] as number) >= failCost)
      return outcomeOf(this.checks.trialAt(shock, cheapest), null);
    const costs = [...this.costs];
    const cost = (place: number): number => costs[place] ?? 0;
    let best: { cost: number; rank: number; place: number; room: ReservoirAnswer | null } | null = null;
    const ranked = this.order
      .map((place, rank) => ({ place, rank }))
      .sort((a, b) => cost(a.place) - cost(b.place));
    for (const { place, rank } of ranked) {
      const least = cost(place);
      if (best && (best.cost < least || (best.cost === least && best.rank < rank))) break;
      const room: ReservoirAnswer | null =
        least < failCost ? reservoirCheck(this.checks.trialAt(shock, place)) : null;
      const whole: number = least + (room ? costOf(room.answer) : 0);
      if (!best || whole < best.cost || (whole === best.cost && rank < best.rank)) {
        best = { cost: whole, rank, place, room };
      }
    }
    return outcomeOf(this.checks.trialAt(shock, best?.place ?? cheapest), best?.room ?? null);
  }

  /** The cheapest place, while the row, the pressures and the costs are those of this shock. */
  private cheapest(shock: ShockFacts): number {
    const { checks, row, pressures, costs, order } = this;
    checks.fill(shock, row);
    for (let place = 0; place < checks.places; place += ways.length) {
      const pressure = checks.pressure(shock, place / ways.length);
      pressures[place / ways.length] = pressure;
      for (let way = 0; way < ways.length; way += 1) costs[place + way] = pressure.cost;
    }
    for (let i = 0; i < row.length; i += 1) {
      const lights = row[i] as ByPlace;
      for (let place = 0; place < lights.length; place += 1) {
        costs[place] = (costs[place] as number) + (lights[place] as Lights).cost;
      }
    }
    let best = order[0];
    if (best === undefined) throw new RangeError('a frame needs at least one entry');
    for (let rank = 1; rank < order.length; rank += 1) {
      const place = order[rank] as number;
      if ((costs[place] as number) < (costs[best] as number)) best = place;
    }
    return best;
  }

  private firstFail(place: number): Light {
    for (let i = 0; i < this.row.length; i += 1) {
      const { cost, lights } = (this.row[i] as ByPlace)[place] as Lights;
      if (cost >= failCost) return lights.find(fails) as Light;
      if (i !== this.checks.beforePressure) continue;
      const pressure = this.pressures[Math.floor(place / ways.length)] as Lights;
      if (pressure.cost >= failCost) return pressure.lights[0] as Light;
    }
    throw new Error('nothing fails');
  }
}

const fails = ({ cost }: Light): boolean => cost >= failCost;
