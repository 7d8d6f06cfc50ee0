export const MODES = ['accept', 'refuse', 'stall'] as const;

export type MailMode = (typeof MODES)[number];

export interface ModeOptions {
  /** SMTP reply to RCPT in mode refuse: 451 (try again later, the default) or 550 (never). */
  code?: number;
  /** How long mode stall keeps a client waiting after DATA; 30 s unless told. */
  stallMs?: number;
}

export interface ModeState {
  mode: MailMode;
  code: number;
  stallMs: number;
}

/** How the server treats who comes next; accept is how it starts. */
export class ModeSwitch {
  private state: ModeState = { mode: 'accept', code: 451, stallMs: 30_000 };

  get current(): ModeState {
    return this.state;
  }

  set(mode: MailMode, { code = 451, stallMs = 30_000 }: ModeOptions = {}): ModeState {
    if (code < 400 || code > 599) throw new RangeError('code must be from 400 to 599');
    this.state = { mode, code, stallMs };
    return this.state;
  }
}

export function isMode(value: unknown): value is MailMode {
  return MODES.some((mode) => mode === value);
}
