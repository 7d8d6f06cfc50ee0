import { Injectable } from '@nestjs/common';

import { PlansException } from '../plans/plans.exception.js';
import { PlansService } from '../plans/plans.service.js';
import { CheckoutException } from './checkout.exception.js';

type Missing = Awaited<ReturnType<PlansService['view']>>['missing'];

/** Slots named in a refusal. */
const slotsNamed = 6;

/** Says kindly what somebody else has taken, with what is still to be had. */
@Injectable()
export class CheckoutRefusals {
  constructor(private readonly plans: PlansService) {}

  /** The refusal that the rider reads, made after the transaction has been rolled back; other errors as they are. */
  async explain(planId: string, error: unknown): Promise<unknown> {
    if (error instanceof CheckoutException && error.code === 'slot-taken')
      return this.slotTaken(planId, error);
    if (!(error instanceof PlansException) || error.code !== 'not-ready') return error;
    const codes = ((error.extras.extensions?.missing ?? []) as Missing).map(({ code }) => code);
    if (codes.includes('stock-gone')) return this.soldOut(planId, error);
    if (codes.length > 0 && codes.every((code) => code === 'slot-gone')) return this.slotTaken(planId, error);
    return error;
  }

  private async soldOut(planId: string, cause: unknown): Promise<CheckoutException> {
    const { items } = await this.plans.view(planId);
    const gone = items.filter(({ offers }) => offers.length === 0).map(({ name }) => name);
    const detail = `${gone.length > 0 ? gone.join(' and ') : 'One of the parts'} has just sold out everywhere. Your plan and answers are kept; choose another shock.`;
    return new CheckoutException('stock-gone', { detail, extensions: { items: gone }, cause });
  }

  private async slotTaken(planId: string, cause: unknown): Promise<CheckoutException> {
    const { slots } = await this.plans.view(planId);
    return new CheckoutException('slot-taken', {
      detail: 'Somebody has just taken that date. Your plan and answers are kept; choose another.',
      extensions: { slots: slots.slice(0, slotsNamed) },
      cause,
    });
  }
}
