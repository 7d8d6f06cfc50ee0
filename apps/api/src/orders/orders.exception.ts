import { problems } from '../common/problems/problem.exception.js';

export class OrdersException extends problems({
  'not-now': { status: 409, title: 'That cannot be done with this order any more' },
  'already-sent': { status: 409, title: 'Something has been sent already' },
  'slot-taken': { status: 409, title: 'That date has just been taken' },
  'self-fit-not-offered': { status: 409, title: 'This work is for a workshop' },
  'no-such-workshop': { status: 422, title: 'That workshop cannot do this work at what was paid' },
}) {}
