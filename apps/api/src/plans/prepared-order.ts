import type { DrawnShock, Verdict, WorkId } from '@linkfell/contracts';

export interface PreparedLine {
  kind: 'item' | 'carriage' | 'work';
  sellerId: string;
  listingId: string | null;
  itemId: string | null;
  description: string;
  note: string | null;
  quantity: number;
  /** VAT included. */
  unitMinor: number;
  vatRateBp: number;
}

/** What the mechanic needs, as it was judged when the order was placed; later sheet versions change nothing sold. */
export interface JobSnapshot {
  bike: string;
  frameSheet: string;
  entry: string;
  oldShock: string;
  newShock: string;
  wayRound: string;
  ends: { end: 'frame' | 'link'; what: string; thread: string | null; torqueNm: number | null }[];
  spring: {
    kind: 'air' | 'coil';
    say: string;
    gaugePsi: number | null;
    rateLbPerIn: number | null;
    sag: string;
  };
  parts: { name: string; end: 'frame' | 'link' | null; quantity: number }[];
  work: { id: WorkId; say: string; minutes: number; priceMinor: number }[];
  tools: string[];
  cautions: string[];
  selfFitAllowed: boolean;
  selfFitReason: string | null;
  riderWeight: string;
  verdict: Verdict;
  drawing: DrawnShock;
}

/** A plan made ready to be ordered: everything that the order keeps. */
export interface PreparedOrder {
  planId: string;
  measureUpId: string;
  fit: 'self' | 'workshop';
  title: string;
  shockName: string;
  verdict: Verdict;
  currency: 'gbp';
  totalMinor: number;
  lines: PreparedLine[];
  /** `dispatchBy` is an ISO day in the shop's zone. */
  parcels: { shopId: string; dispatchBy: string }[];
  /** `standIds` are free at that time, to be tried in order. */
  booking: { workshopId: string; standIds: string[]; start: Date; end: Date } | null;
  job: JobSnapshot;
}
