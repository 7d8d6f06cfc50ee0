import { invalidParam, missing } from '../http/api-error.js';
import type { Params } from '../http/params.js';
import { isCurrency } from '../objects/money.js';
import type { StoredLine } from '../objects/stored.js';
import { newId, nowSeconds } from '../store/ids.js';

const MAX_LINES = 100;
const MAX_UNIT_AMOUNT = 99_999_999;

function readLine(line: Params): StoredLine {
  line.only('price_data', 'quantity', 'price', 'metadata');
  const priceId = line.text('price');
  if (priceId) throw missing('price', priceId, 'line_items');
  if (!line.has('price_data')) throw line.absent('price_data');
  const data = line.child('price_data').only('currency', 'unit_amount', 'product_data', 'tax_behavior');
  const name = data
    .child('product_data')
    .only('name', 'description', 'images', 'metadata', 'tax_code')
    .needText('name');
  const currency = data.needText('currency').toLowerCase();
  if (!isCurrency(currency)) throw data.wrong('currency', `Invalid currency: ${currency}.`);
  const unit = data.needWhole('unit_amount');
  if (unit < 0 || unit > MAX_UNIT_AMOUNT) {
    throw data.wrong('unit_amount', 'Invalid non-negative integer', 'parameter_invalid_integer');
  }
  const quantity = line.whole('quantity');
  if (quantity === undefined)
    throw line.wrong('quantity', 'Quantity is required. Add `quantity` to the line item.');
  if (quantity < 1) throw line.wrong('quantity', 'Invalid positive integer', 'parameter_invalid_integer');
  return {
    id: newId('li'),
    object: 'item',
    adjustable_quantity: null,
    amount_discount: 0,
    amount_subtotal: unit * quantity,
    amount_tax: 0,
    amount_total: unit * quantity,
    currency,
    description: name,
    metadata: line.metadata(),
    price: {
      id: newId('price'),
      object: 'price',
      active: false,
      billing_scheme: 'per_unit',
      created: nowSeconds(),
      currency,
      custom_unit_amount: null,
      livemode: false,
      lookup_key: null,
      metadata: {},
      nickname: null,
      product: newId('prod', 14),
      recurring: null,
      tax_behavior: data.oneOf('tax_behavior', ['inclusive', 'exclusive', 'unspecified']) ?? 'unspecified',
      tiers_mode: null,
      transform_quantity: null,
      type: 'one_time',
      unit_amount: unit,
      unit_amount_decimal: String(unit),
    },
    quantity,
  };
}

/** The lines of a new session: 1 to 100, each priced in place, all in one currency. */
export function readLines(params: Params): StoredLine[] {
  const items = params.list('line_items');
  if (items.length === 0) throw params.absent('line_items');
  if (items.length > MAX_LINES) throw invalidParam('line_items can have up to 100 items.', 'line_items');
  const lines = items.map(readLine);
  if (new Set(lines.map((line) => line.currency)).size > 1) {
    throw invalidParam('All line items must have the same currency.', 'line_items');
  }
  return lines;
}
