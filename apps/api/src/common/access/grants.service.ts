import { Injectable } from '@nestjs/common';
import type { Request } from 'express';

import { mergeGrants, type GuestGrants } from './grants.js';

const none: GuestGrants = { measureUps: [], orders: [] };

/** Guest grants live in the session: they say what this browser may open without an account. */
@Injectable()
export class GrantsService {
  of(request: Request): GuestGrants {
    return request.session?.grants ?? none;
  }

  addMeasureUp(request: Request, id: string): void {
    request.session.grants = mergeGrants(this.of(request), { ...none, measureUps: [id] });
  }

  addOrder(request: Request, id: string): void {
    request.session.grants = mergeGrants(this.of(request), { ...none, orders: [id] });
  }

  hasMeasureUp(request: Request, id: string): boolean {
    return this.of(request).measureUps.includes(id);
  }

  hasOrder(request: Request, id: string): boolean {
    return this.of(request).orders.includes(id);
  }
}
