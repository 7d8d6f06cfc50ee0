/** Copies of a value, each with one of its numbers replaced. */
export function spoilt<T>(value: T, by: number): T[] {
  if (typeof value === 'number') return [by as T];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    spoilt(inner as unknown, by).map((other) => {
      const copy = (Array.isArray(value) ? [...(value as unknown[])] : { ...value }) as Record<
        string,
        unknown
      >;
      copy[key] = other;
      return copy as T;
    }),
  );
}
