import type { Judgement } from '@linkfell/fit-engine';

/** What is kept with an order of the judgement it was sold on, so that later sheet versions change nothing sold. */
export interface OrderJob {
  judgement: Judgement;
}
