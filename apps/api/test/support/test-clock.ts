import { Clock } from '../../src/common/clock.js';

const minute = 60_000;

/** Stands still until told otherwise. Starts on a Monday, at half past nine in the morning, UTC. */
export class TestClock extends Clock {
  private time = new Date('2026-03-02T09:30:00Z').getTime();

  override now(): Date {
    return new Date(this.time);
  }

  set(instant: string): void {
    this.time = new Date(instant).getTime();
  }

  advance(by: { minutes?: number; hours?: number; days?: number }): void {
    this.time += ((by.minutes ?? 0) + (by.hours ?? 0) * 60 + (by.days ?? 0) * 24 * 60) * minute;
  }
}
