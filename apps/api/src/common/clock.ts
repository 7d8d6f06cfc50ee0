import { Injectable } from '@nestjs/common';

/** The only place that asks what time it is, so that a test can hold it still. */
@Injectable()
export class Clock {
  now(): Date {
    return new Date();
  }
}
