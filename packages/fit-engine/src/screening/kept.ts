/**
 * Results kept by the figures that they depend on, one step of a path per figure. A figure that is no number is a
 * key like any other. Finding what is there allocates nothing.
 */
export class Kept<T> {
  private readonly next = new Map<unknown, Kept<T>>();
  value: T | null = null;

  at(figure: unknown): Kept<T> {
    const before = this.next.get(figure);
    if (before) return before;
    const made = new Kept<T>();
    this.next.set(figure, made);
    return made;
  }
}
