import { problems } from '../common/problems/problem.exception.js';

export class CheckoutException extends problems({
  'price-changed': { status: 409, title: 'The price has changed' },
  'stock-gone': { status: 409, title: 'Somebody was quicker' },
  'held-elsewhere': { status: 409, title: 'This plan is being paid for already' },
  'slot-taken': { status: 409, title: 'That date has just been taken' },
}) {}
