import { spoilt } from '../judging/spoilt.js';

/** What is wrong with what a function makes of a figure that is no number; none if nothing is. */
export type Complaints = (by: number) => string[];

function finiteIn(value: unknown): number[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [value] : [];
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(finiteIn) : [];
}

/** Every number of the arguments spoilt in turn: no number may come out. */
export const givesNoNumber =
  <A extends unknown[]>(run: (...args: A) => unknown, ...args: A): Complaints =>
  (by) => {
    // Whole arguments must give one, or the test would prove nothing.
    const whole = run(...args);
    const sound = finiteIn(whole).length > 0 ? [] : ['no number out of numbers'];
    return sound.concat(
      spoilt(args, by).flatMap((bad) =>
        finiteIn(run(...bad)).map((out) => `${out} out of ${JSON.stringify(bad, spelt)}`),
      ),
    );
  };

const spelt = (_key: string, value: unknown): unknown =>
  typeof value === 'number' && !Number.isFinite(value) ? String(value) : value;

/** Every number spoilt in turn: no text names one that is none. */
export const saysNone =
  <A extends unknown[]>(run: (...args: A) => unknown, ...args: A): Complaints =>
  (by) =>
    spoilt(args, by)
      .map((bad) => JSON.stringify(run(...bad), spelt) ?? '')
      .filter((text) => /NaN|Infinity/.test(text));

/** What is no number as a text is refused. */
export const refusesText =
  (run: (text: string) => unknown, ...texts: ((spelt: string) => string)[]): Complaints =>
  (by) =>
    texts
      .map((text) => text(String(by)))
      .filter((text) => run(text) !== null)
      .map((text) => `"${text}" was read`);

/** The same as if the spoilt figure had not been told. */
export const asIfUntold =
  (spoiltOne: (by: number) => unknown, untold: () => unknown): Complaints =>
  (by) =>
    JSON.stringify(spoiltOne(by)) === JSON.stringify(untold()) ? [] : ['differs from not told'];

/** Reads no figure, so none can spoil it; the reason stands where it is listed. */
export const readsNoFigure: Complaints = () => [];
