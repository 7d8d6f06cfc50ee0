import type { FitQuestion } from '../../src/facts.js';

type Node = Record<string, unknown>;

/** A copy of a question with one value set: "frame.entries.0.frameEnd.mount.widthMm". */
export function change(question: FitQuestion, path: string, value: unknown): FitQuestion {
  const copy = structuredClone(question);
  const steps = path.split('.');
  const last = steps.pop();
  let node = copy as unknown as Node;
  for (const step of steps) {
    const next = node[step];
    if (typeof next !== 'object' || next === null) return copy;
    node = next as Node;
  }
  if (last === undefined || !(last in node)) throw new Error(`a question has no ${path}`);
  node[last] = value;
  return copy;
}

/** Every path to a value of one kind, e.g. all numbers. */
export function pathsTo(question: FitQuestion, wanted: (value: unknown) => boolean): string[] {
  const found: string[] = [];
  const walk = (value: unknown, path: string): void => {
    if (wanted(value)) found.push(path);
    if (typeof value !== 'object' || value === null) return;
    for (const [key, inner] of Object.entries(value)) walk(inner, path === '' ? key : `${path}.${key}`);
  };
  walk(question, '');
  return found;
}
