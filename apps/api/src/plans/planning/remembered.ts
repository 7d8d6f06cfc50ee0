/**
 * Remembers what a pure function of a key has given, so many answers at most; then it starts anew. For calendar
 * arithmetic, which is slow and asked the same things by every rider of a day.
 */
export class Remembered<T> {
  private readonly answers = new Map<string, T>();

  constructor(private readonly most: number) {}

  of(key: string, work: () => T): T {
    const before = this.answers.get(key);
    if (before !== undefined) return before;
    const made = work();
    if (this.answers.size >= this.most) this.answers.clear();
    this.answers.set(key, made);
    return made;
  }
}
