import type { StoredMessage } from './message.js';

const KEEP = 500;

/** The messages that were accepted, the newest 500. */
export class Mailbox {
  private kept: StoredMessage[] = [];

  add(message: StoredMessage): void {
    this.kept.push(message);
    if (this.kept.length > KEEP) this.kept.shift();
  }

  /** The newest first. */
  newest(): StoredMessage[] {
    return [...this.kept].reverse();
  }

  /** The newest first; `to` matches a whole address of header or envelope, `subject` a part, both without case. */
  search({ to, subject }: { to?: string; subject?: string }): StoredMessage[] {
    const address = to?.toLowerCase();
    const part = subject?.toLowerCase();
    return this.newest().filter(
      (message) =>
        (!address ||
          [...message.to, ...message.cc, ...message.envelope.to].some(
            (one) => one.toLowerCase() === address,
          )) &&
        (!part || message.subject.toLowerCase().includes(part)),
    );
  }

  find(id: string): StoredMessage | undefined {
    return this.kept.find((message) => message.id === id);
  }

  clear(): void {
    this.kept = [];
  }
}
