import { problems } from '../common/problems/problem.exception.js';

export class StockException extends problems({
  'held-for-orders': { status: 409, title: 'Some of these are held for orders' },
  'not-now': { status: 409, title: 'This parcel is not to be sent' },
}) {}
