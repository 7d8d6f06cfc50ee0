import type { JobSnapshot } from '../plans/prepared-order.js';

/** What is kept with an order of the judgement it was sold on, so that later sheet versions change nothing sold. */
export type OrderJob = JobSnapshot & { title: string; shockName: string };
