import { hasValidCheckDigit } from '../payments/test-cards.js';

/** What was typed into the payment page, under the names of its inputs. */
export interface CardForm {
  number: string;
  expiry: string;
  cvc: string;
  name: string;
  email: string;
}

export interface FieldError {
  field: keyof CardForm;
  message: string;
}

export const EMPTY_FORM: CardForm = { number: '', expiry: '', cvc: '', name: '', email: '' };

export function readCardForm(body: unknown): CardForm {
  const sent = (body ?? {}) as Partial<Record<keyof CardForm, unknown>>;
  const text = (value: unknown): string => (typeof value === 'string' ? value.trim().slice(0, 200) : '');
  return {
    number: text(sent.number),
    expiry: text(sent.expiry),
    cvc: text(sent.cvc),
    name: text(sent.name),
    email: text(sent.email),
  };
}

export function digitsOf(number: string): string {
  return number.replace(/[\s-]/g, '');
}

function expiryError(expiry: string, now: Date): string | undefined {
  const match = /^(0[1-9]|1[0-2])\s*\/?\s*(?:20)?(\d{2})$/.exec(expiry);
  if (!match) return 'Enter the expiry date as month and year, such as 12/34';
  const month = Number(match[1]);
  const year = 2000 + Number(match[2]);
  const past =
    year < now.getUTCFullYear() || (year === now.getUTCFullYear() && month < now.getUTCMonth() + 1);
  return past ? 'The expiry date is in the past' : undefined;
}

/** What is wrong with the form, in the order of its fields. An e-mail address is needed only when asked for. */
export function checkCardForm(form: CardForm, askEmail: boolean, now = new Date()): FieldError[] {
  const errors: FieldError[] = [];
  const add = (field: keyof CardForm, message: string | undefined): void => {
    if (message) errors.push({ field, message });
  };
  if (askEmail && !/^[^\s@]+@[^\s@]+$/.test(form.email))
    add('email', 'Enter an e-mail address, such as rider@example.com');
  const number = digitsOf(form.number);
  if (!number) add('number', 'Enter a card number');
  else if (!hasValidCheckDigit(number))
    add('number', 'This card number is not complete or has a wrong digit');
  add('expiry', expiryError(form.expiry, now));
  if (!/^\d{3,4}$/.test(form.cvc)) add('cvc', 'Enter the security code, 3 or 4 digits');
  if (!form.name) add('name', 'Enter the name on the card');
  return errors;
}
