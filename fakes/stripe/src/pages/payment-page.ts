import { formatMoney } from '../objects/money.js';
import type { StoredLine, StoredSession } from '../objects/stored.js';
import { TEST_CARDS } from '../payments/test-cards.js';
import type { CardForm, FieldError } from './card-form.js';
import { markup, type Html } from './html.js';

export interface PaymentPage {
  session: StoredSession;
  lines: StoredLine[];
  email: string | null;
  form: CardForm;
  errors: FieldError[];
  /** Why the last card was not charged. */
  declined: string | null;
}

interface Field {
  name: keyof CardForm;
  label: string;
  hint: string;
  autocomplete: string;
  numeric?: boolean;
  short?: boolean;
  type?: string;
}

const EMAIL: Field = {
  name: 'email',
  label: 'E-mail',
  hint: 'For the receipt',
  autocomplete: 'email',
  type: 'email',
};
const CARD: Field[] = [
  {
    name: 'number',
    label: 'Card number',
    hint: 'One of the test cards below',
    autocomplete: 'cc-number',
    numeric: true,
  },
  {
    name: 'expiry',
    label: 'Expiry date',
    hint: 'Any month to come, such as 12/34',
    autocomplete: 'cc-exp',
    numeric: true,
    short: true,
  },
  {
    name: 'cvc',
    label: 'Security code (CVC)',
    hint: 'Any three digits',
    autocomplete: 'cc-csc',
    numeric: true,
    short: true,
  },
  { name: 'name', label: 'Name on card', hint: 'Any name', autocomplete: 'cc-name' },
];

function field(page: PaymentPage, { name, label, hint, autocomplete, numeric, short, type }: Field): Html {
  const error = page.errors.find((one) => one.field === name);
  return markup`<label for="${name}">${label}</label>
    <p class="hint" id="${name}-hint">${hint}</p>
    ${error && markup`<p class="error" id="${name}-error">${error.message}</p>`}
    <input
      id="${name}"
      name="${name}"
      type="${type ?? 'text'}"
      value="${page.form[name]}"
      autocomplete="${autocomplete}"
      ${numeric && markup`inputmode="numeric"`}
      ${short && markup`class="short"`}
      ${error && markup`aria-invalid="true"`}
      aria-describedby="${name}-hint${error ? ` ${name}-error` : ''}"
      required
    /> `;
}

function problems({ errors, declined }: PaymentPage): Html | false {
  if (errors.length > 0) {
    return markup`<div class="bad" role="alert" tabindex="-1" autofocus>
      <h2>Please check what you typed</h2>
      <ul>
        ${errors.map(({ field: name, message }) => markup`<li><a href="#${name}">${message}</a></li>`)}
      </ul>
    </div>`;
  }
  if (!declined) return false;
  return markup`<div class="bad" role="alert" tabindex="-1" autofocus>
    <h2>The card was not charged</h2>
    <p>${declined} You can try another card.</p>
  </div>`;
}

/** Groups of four digits, as on a card. */
const grouped = (number: string): string => number.replace(/(\d{4})(?=\d)/g, '$1 ');

export function paymentTitle(page: PaymentPage): string {
  return page.errors.length > 0 || page.declined ? 'Error: Test payment page' : 'Test payment page';
}

export function paymentBody(page: PaymentPage): Html {
  const { session, lines, email } = page;
  const currency = session.currency ?? 'gbp';
  const total = formatMoney(session.amount_total ?? 0, currency);
  const rows = lines.map(
    (line) =>
      markup`<tr>
        <th scope="row">${line.description}</th>
        <td>${line.quantity}</td>
        <td class="money">${formatMoney(line.amount_total, currency)}</td>
      </tr>`,
  );
  return markup`<h1>Test payment page</h1>
    <p class="note">This is a test server. No real money moves, and no real card belongs here.</p>
    ${problems(page)}
    <table>
      <caption>
        What you are paying for
      </caption>
      <thead>
        <tr>
          <th scope="col">Item</th>
          <th scope="col">Quantity</th>
          <th scope="col">Price</th>
        </tr>
      </thead>
      <tbody>
        ${rows}
      </tbody>
      <tfoot>
        <tr>
          <th scope="row" colspan="2">To pay</th>
          <td class="money">${total}</td>
        </tr>
      </tfoot>
    </table>
    ${email && markup`<p>Receipt to ${email}</p>`}
    <h2>Card</h2>
    <form method="post" action="/pay/${session.id}" novalidate>
      ${!email && field(page, EMAIL)} ${CARD.map((one) => field(page, one))}
      <button type="submit">Pay ${total}</button>
    </form>
    ${
      session.cancel_url &&
      markup`<form class="row" method="post" action="/pay/${session.id}/cancel">
        <button class="quiet" type="submit">Cancel and go back</button>
      </form>`
    }
    <h2>Test cards</h2>
<ul class="cards">${TEST_CARDS.map(({ number, says }) => markup`<li><code>${grouped(number)}</code> ${says}</li>`)}</ul>`;
}
