import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';
import type { Store } from './store.js';

const SAVE_DELAY_MS = 100;

/**
 * Keeps the store in a JSON file, so that payments made before a restart can still be refunded after it.
 * Without a path it does nothing.
 */
export class StateFile {
  private timer: NodeJS.Timeout | undefined;
  private closed = false;

  constructor(
    private readonly store: Store,
    private readonly path: string | undefined,
  ) {}

  load(): void {
    if (this.path && existsSync(this.path)) {
      this.store.load(JSON.parse(readFileSync(this.path, 'utf8')) as Record<string, [string, unknown][]>);
    }
  }

  /** Writes soon; many changes at once cost one write. */
  touch(): void {
    if (!this.path || this.timer || this.closed) return;
    this.timer = setTimeout(() => this.flush(), SAVE_DELAY_MS);
    this.timer.unref();
  }

  /** Writes for the last time. */
  close(): void {
    this.flush();
    this.closed = true;
  }

  private flush(): void {
    clearTimeout(this.timer);
    this.timer = undefined;
    if (!this.path) return;
    mkdirSync(dirname(this.path), { recursive: true });
    // Written beside and renamed: a kill in the middle leaves the old file whole.
    writeFileSync(`${this.path}.new`, JSON.stringify(this.store), { mode: 0o600 });
    renameSync(`${this.path}.new`, this.path);
  }
}
