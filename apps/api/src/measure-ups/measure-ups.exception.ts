import { problems } from '../common/problems/problem.exception.js';

export class MeasureUpsException extends problems({
  'no-such-frame': { status: 422, title: 'That frame is not in our list' },
  'no-such-town': { status: 422, title: 'That town is not on our map' },
  'not-a-size': { status: 422, title: 'That is not a size we know' },
  'no-frame-yet': { status: 409, title: 'Choose or describe your frame first' },
}) {}
