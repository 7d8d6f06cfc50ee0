import { Injectable, type BeforeApplicationShutdown } from '@nestjs/common';
import { HealthIndicatorService } from '@nestjs/terminus';

/** Remembers that we were told to stop, so that the load balancer sends no more. */
@Injectable()
export class Drain implements BeforeApplicationShutdown {
  private stopping = false;

  constructor(private readonly indicators: HealthIndicatorService) {}

  beforeApplicationShutdown(): void {
    this.stopping = true;
  }

  indicate() {
    const indicator = this.indicators.check('draining');
    return this.stopping ? indicator.down() : indicator.up();
  }
}
