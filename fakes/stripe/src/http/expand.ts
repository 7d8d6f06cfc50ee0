import { present, presentLines, presentRefundsOf } from '../objects/present.js';
import type { FakeContext } from '../context.js';
import { invalidParam } from './api-error.js';

type Node = Record<string, unknown>;

const MAX_DEPTH = 4;

/** Fields that only an expansion shows, and where they come from. */
function hiddenField(fake: FakeContext, node: Node, field: string): unknown {
  const id = String(node.id);
  if (node.object === 'checkout.session' && field === 'line_items') return presentLines(fake, id);
  if (node.object === 'charge' && field === 'refunds') return presentRefundsOf(fake, id);
  return undefined;
}

function expandPath(fake: FakeContext, node: unknown, [field, ...rest]: string[], whole: string): void {
  if (field === undefined) return;
  if (Array.isArray(node)) {
    for (const item of node) expandPath(fake, item, [field, ...rest], whole);
    return;
  }
  if (node === null || typeof node !== 'object') return;
  const object = node as Node;
  const value = object[field] ?? hiddenField(fake, object, field);
  if (value === undefined) throw invalidParam(`This property cannot be expanded (${whole}).`, 'expand');
  if (value === null) return;
  if (typeof value === 'string') {
    const found = present(fake, value);
    if (!found) throw invalidParam(`This property cannot be expanded (${whole}).`, 'expand');
    object[field] = found;
  } else {
    object[field] = value;
  }
  expandPath(fake, object[field], rest, whole);
}

/** Replaces the ids named by `expand[]` with their objects, in a copy that may be changed. */
export function expand(fake: FakeContext, answer: unknown, paths: string[]): unknown {
  for (const path of paths) {
    const fields = path.split('.');
    if (fields.filter((field) => field !== 'data').length > MAX_DEPTH) {
      throw invalidParam('You cannot expand more than 4 levels.', 'expand');
    }
    expandPath(fake, answer, fields, path);
  }
  return answer;
}
