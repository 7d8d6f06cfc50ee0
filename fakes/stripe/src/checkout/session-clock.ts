const MAX_TIMER_MS = 2 ** 31 - 1;
/** Timers may fire a touch early, and a session that is not due yet would be left open. */
const MARGIN_MS = 20;

/** One timer per open session, so that it expires by itself. */
export class SessionClock {
  private timers = new Map<string, NodeJS.Timeout>();

  constructor(private readonly onDue: (sessionId: string) => void) {}

  /** Expires the session at a time given in seconds since 1970. */
  set(sessionId: string, expiresAt: number): void {
    this.clear(sessionId);
    const delay = Math.min(Math.max(0, expiresAt * 1000 - Date.now()) + MARGIN_MS, MAX_TIMER_MS);
    const timer = setTimeout(() => this.onDue(sessionId), delay);
    timer.unref();
    this.timers.set(sessionId, timer);
  }

  clear(sessionId: string): void {
    clearTimeout(this.timers.get(sessionId));
    this.timers.delete(sessionId);
  }

  clearAll(): void {
    for (const timer of this.timers.values()) clearTimeout(timer);
    this.timers.clear();
  }
}
