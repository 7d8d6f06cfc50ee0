import { invalidParam } from './api-error.js';

const WHOLE = /^-?\d{1,15}$/;

/**
 * Form parameters, as the urlencoded parser leaves them: every leaf a string, lists as arrays or as objects
 * with numbers for keys. Names in errors are written as the client sent them: `line_items[0][quantity]`.
 */
export class Params {
  private readonly values: Record<string, unknown>;

  constructor(
    values: unknown,
    private readonly prefix = '',
  ) {
    this.values = values !== null && typeof values === 'object' ? (values as Record<string, unknown>) : {};
  }

  private name(key: string): string {
    return this.prefix ? `${this.prefix}[${key}]` : key;
  }

  has(key: string): boolean {
    return this.values[key] !== undefined;
  }

  /** Text, or undefined when it was not sent or sent empty (which is how the API unsets a value). */
  text(key: string): string | undefined {
    const value = this.values[key];
    if (value === undefined || value === '') return undefined;
    if (typeof value !== 'string')
      throw invalidParam(`Invalid string: ${JSON.stringify(value)}`, this.name(key));
    return value;
  }

  needText(key: string): string {
    const value = this.text(key);
    if (value === undefined) throw this.absent(key);
    return value;
  }

  whole(key: string): number | undefined {
    const value = this.text(key);
    if (value === undefined) return undefined;
    if (!WHOLE.test(value)) {
      throw invalidParam(`Invalid integer: ${value}`, this.name(key), 'parameter_invalid_integer');
    }
    return Number(value);
  }

  needWhole(key: string): number {
    const value = this.whole(key);
    if (value === undefined) throw this.absent(key);
    return value;
  }

  flag(key: string): boolean | undefined {
    const value = this.text(key);
    if (value === undefined) return undefined;
    if (value !== 'true' && value !== 'false')
      throw invalidParam(`Invalid boolean: ${value}`, this.name(key));
    return value === 'true';
  }

  oneOf<T extends string>(key: string, allowed: readonly T[]): T | undefined {
    const value = this.text(key);
    if (value === undefined) return undefined;
    const found = allowed.find((candidate) => candidate === value);
    if (!found) {
      throw invalidParam(`Invalid ${this.name(key)}: must be one of ${allowed.join(', ')}`, this.name(key));
    }
    return found;
  }

  child(key: string): Params {
    return new Params(this.values[key], this.name(key));
  }

  list(key: string): Params[] {
    const value = this.values[key];
    if (value === undefined || value === null || typeof value !== 'object') return [];
    return Object.values(value).map((item, index) => new Params(item, `${this.name(key)}[${index}]`));
  }

  texts(key: string): string[] {
    const value = this.values[key];
    if (value === undefined) return [];
    const items = typeof value === 'object' && value !== null ? Object.values(value) : [value];
    return items.filter((item): item is string => typeof item === 'string');
  }

  /** Key-value pairs within the API's limits: 50 keys of 40 characters, values of 500. */
  metadata(key = 'metadata'): Record<string, string> {
    const entries = Object.entries(this.child(key).values);
    if (entries.length > 50) throw invalidParam('Metadata can have up to 50 keys.', this.name(key));
    for (const [name, value] of entries) {
      if (typeof value !== 'string')
        throw invalidParam('Metadata values must be strings.', `${this.name(key)}[${name}]`);
      if (name.length > 40) throw invalidParam(`Metadata key ${name} is over 40 characters.`, this.name(key));
      if (value.length > 500) {
        throw invalidParam('Metadata values can have up to 500 characters.', `${this.name(key)}[${name}]`);
      }
    }
    return Object.fromEntries(entries.filter(([, value]) => value !== '')) as Record<string, string>;
  }

  /** Metadata after an update: keys sent empty go, keys sent with a value are set, the rest stays. */
  mergeMetadata(before: Record<string, string>): Record<string, string> {
    if (this.values.metadata === '') return {};
    const sent = this.child('metadata').values;
    const kept = Object.fromEntries(Object.entries(before).filter(([name]) => sent[name] !== ''));
    return { ...kept, ...this.metadata() };
  }

  /** Refuses every parameter that is not named here, as the API does. `expand` is always allowed. */
  only(...names: string[]): this {
    for (const key of Object.keys(this.values)) {
      if (key !== 'expand' && !names.includes(key)) {
        const name = this.name(key);
        throw invalidParam(`Received unknown parameter: ${name}`, name, 'parameter_unknown');
      }
    }
    return this;
  }

  /** The error for a value that was sent but cannot be. */
  wrong(key: string, message: string, code?: string): Error {
    return invalidParam(message, this.name(key), code);
  }

  /** The error for a value that has to be sent. */
  absent(key: string): Error {
    return invalidParam(`Missing required param: ${this.name(key)}.`, this.name(key), 'parameter_missing');
  }
}
