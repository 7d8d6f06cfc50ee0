import type {
  IntentDetail,
  SessionDetail,
  StoredAccount,
  StoredCharge,
  StoredCustomer,
  StoredEvent,
  StoredIntent,
  StoredRefund,
  StoredReversal,
  StoredSession,
  StoredTransfer,
} from '../objects/stored.js';
import type { IdempotencyRecord } from '../http/idempotency.js';

/** Rows of one kind by id, in order of creation. */
export class Table<T> {
  private rows = new Map<string, T>();

  get(id: string): T | undefined {
    return this.rows.get(id);
  }

  set(id: string, row: T): T {
    this.rows.set(id, row);
    return row;
  }

  delete(id: string): void {
    this.rows.delete(id);
  }

  /** Every row, the oldest first. */
  all(): T[] {
    return [...this.rows.values()];
  }

  /** Every row that the test accepts, the newest first: the order in which the API lists. */
  newest(accept: (row: T) => boolean = () => true): T[] {
    return this.all().filter(accept).reverse();
  }

  entries(): [string, T][] {
    return [...this.rows.entries()];
  }

  load(entries: [string, T][]): void {
    this.rows = new Map(entries);
  }
}

/** All that the fake remembers. Plain data, so that it can be written to a file and read back. */
export class Store {
  readonly sessions: Table<StoredSession> = new Table();
  readonly sessionDetails: Table<SessionDetail> = new Table();
  readonly intents: Table<StoredIntent> = new Table();
  readonly intentDetails: Table<IntentDetail> = new Table();
  readonly charges: Table<StoredCharge> = new Table();
  readonly refunds: Table<StoredRefund> = new Table();
  readonly customers: Table<StoredCustomer> = new Table();
  readonly accounts: Table<StoredAccount> = new Table();
  readonly transfers: Table<StoredTransfer> = new Table();
  readonly reversals: Table<StoredReversal> = new Table();
  readonly events: Table<StoredEvent> = new Table();
  readonly idempotency: Table<IdempotencyRecord> = new Table();

  private tables(): [string, Table<unknown>][] {
    return Object.entries(this).filter(
      (entry): entry is [string, Table<unknown>] => entry[1] instanceof Table,
    );
  }

  clear(): void {
    for (const [, table] of this.tables()) table.load([]);
  }

  toJSON(): Record<string, [string, unknown][]> {
    return Object.fromEntries(this.tables().map(([name, table]) => [name, table.entries()]));
  }

  load(saved: Record<string, [string, unknown][]>): void {
    for (const [name, table] of this.tables()) table.load(saved[name] ?? []);
  }
}
