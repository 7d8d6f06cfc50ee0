import { Injectable } from '@nestjs/common';
import type { Request } from 'express';

import type { GuestGrants } from './session.js';

/** More than anybody needs; keeps a session small when somebody starts measure-ups in a loop. */
const mostKept = 50;

/** Guest grants live in the session: they say what this browser may open without an account. */
@Injectable()
export class GrantsService {
  of(request: Request): GuestGrants {
    return request.session?.grants ?? { measureUps: [], orders: [] };
  }

  addMeasureUp(request: Request, id: string): void {
    this.add(request, 'measureUps', id);
  }

  addOrder(request: Request, id: string): void {
    this.add(request, 'orders', id);
  }

  hasMeasureUp(request: Request, id: string): boolean {
    return this.of(request).measureUps.includes(id);
  }

  hasOrder(request: Request, id: string): boolean {
    return this.of(request).orders.includes(id);
  }

  private add(request: Request, kind: keyof GuestGrants, id: string): void {
    const grants = this.of(request);
    const others = grants[kind].filter((known) => known !== id);
    request.session.grants = { ...grants, [kind]: [...others, id].slice(-mostKept) };
  }
}
