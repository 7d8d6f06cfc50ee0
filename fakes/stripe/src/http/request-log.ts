export interface LoggedRequest {
  id: string;
  at: string;
  method: string;
  path: string;
  body: unknown;
  idempotencyKey: string | null;
  account: string | null;
  status: number | null;
  replayed: boolean;
  fault: string | null;
}

const KEEP = 2000;

/** The calls that were made, for tests that assert on them. The newest are kept. */
export class RequestLog {
  private entries: LoggedRequest[] = [];

  add(entry: LoggedRequest): LoggedRequest {
    this.entries.push(entry);
    if (this.entries.length > KEEP) this.entries.shift();
    return entry;
  }

  all(): LoggedRequest[] {
    return this.entries;
  }

  clear(): void {
    this.entries = [];
  }
}
