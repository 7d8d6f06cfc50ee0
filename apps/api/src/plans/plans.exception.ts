import { problems } from '../common/problems/problem.exception.js';

export class PlansException extends problems({
  'not-fit': { status: 409, title: 'This shock does not fit your bike' },
  'not-ready': { status: 409, title: 'Something is missing before you can pay' },
  'not-an-offer': { status: 422, title: 'That is not on offer for this plan' },
  'already-paid': { status: 409, title: 'This plan has been paid for' },
}) {}
