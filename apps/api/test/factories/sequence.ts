let last = 0;

/** A number that no other builder of this test file gets. */
export function next(): number {
  last += 1;
  return last;
}
