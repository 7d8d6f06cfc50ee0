import { problems } from '../common/problems/problem.exception.js';

export class PaymentsException extends problems({
  'payment-unavailable': { status: 502, title: 'The payment service does not answer' },
  'bad-signature': { status: 400, title: 'This message is not signed as it should be' },
}) {}
