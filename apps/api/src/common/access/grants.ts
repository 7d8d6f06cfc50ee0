/** What a guest may open without an account, by id. */
export interface GuestGrants {
  measureUps: string[];
  orders: string[];
}

/** More than anybody needs; keeps a session small when somebody starts measure-ups in a loop. */
const mostKept = 50;

const union = (older: readonly string[], newer: readonly string[]): string[] =>
  [...older.filter((id) => !newer.includes(id)), ...newer].slice(-mostKept);

/** Both together, newest last; undefined while there are none. */
export function mergeGrants(
  older: GuestGrants | undefined,
  newer: GuestGrants | undefined,
): GuestGrants | undefined {
  if (!older || !newer) return newer ?? older;
  return {
    measureUps: union(older.measureUps, newer.measureUps),
    orders: union(older.orders, newer.orders),
  };
}
