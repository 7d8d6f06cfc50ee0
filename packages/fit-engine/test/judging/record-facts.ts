import type { CheckId } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import type { Shared, Trial } from '../../src/rules/context.js';
import { entryApplies } from '../../src/rules/entry-applies.js';
import { checks } from '../../src/rules/run-trial.js';
import { presentSize } from '../../src/sizing/present-size.js';

/** An object that notes which of its own facts are read, as "prefix.fact". */
function watched<T extends object>(target: T, prefix: string, note: (path: string) => void): T {
  return new Proxy(target, {
    get(of, key) {
      if (typeof key === 'string') note(`${prefix}.${key}`);
      return Reflect.get(of, key);
    },
  });
}

/** Which facts one check reads for one question: of frame, entry, present shock, rider, shock on sale and parts. */
export function factsReadBy(check: CheckId, question: FitQuestion): Set<string> {
  const read = new Set<string>();
  const note = (path: string): void => void read.add(path);
  const entries = question.frame.entries.map((entry) => watched(entry, 'entry', note));
  const frame = watched({ ...question.frame, entries }, 'frame', note);
  const present = watched(question.present, 'present', note);
  const rider = watched(question.rider, 'rider', note);
  const [entry] = entries;
  if (!entry) throw new Error('a question has an entry');
  // What is shared is worked out only when a check asks for it, so that the check is charged with it.
  const shared: Shared = {
    get size() {
      return presentSize(frame, present);
    },
    get applies() {
      return new Map(entries.map((one) => [one, entryApplies(frame, rider, one)]));
    },
    rides: new Map(),
    progressions: new Map(),
    coils: new Map(),
  };
  const trial: Trial = {
    frame,
    present,
    rider,
    shock: watched(question.shock, 'shock', note),
    sale: watched(question.sale, 'sale', note),
    shared,
    entry,
    wayRound: 'body-to-frame',
    full: true,
  };
  checks[check](trial);
  return read;
}
