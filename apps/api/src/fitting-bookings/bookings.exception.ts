import { problems } from '../common/problems/problem.exception.js';

export class BookingsException extends problems({
  'not-now': { status: 409, title: 'That cannot be done with this booking any more' },
  'not-complete': { status: 409, title: 'Something is missing before it can be marked fitted' },
}) {}
