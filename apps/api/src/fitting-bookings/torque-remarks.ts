import type { FittingRecordBody, JobSheetView } from '@linkfell/contracts';
import { torqueSlipRange } from '@linkfell/fit-engine';

type End = Pick<JobSheetView['ends'][number], 'end' | 'thread'>;
type Torque = FittingRecordBody['torques'][number];

/** "13.8", at most one decimal. */
const newtonMetres = (value: number): string => `${Number(value.toFixed(1))} N m`;

/**
 * Remarks on typed torques, N m, against slips of the pen only: never a figure to torque to, and never in the way.
 * A bolt is matched to the end that its name begins with; its thread comes from the frame sheet.
 */
export function torqueRemarks(torques: readonly Torque[], ends: readonly End[]): string[] {
  return torques.flatMap(({ bolt, setNm }) => {
    const thread = threadOf(bolt, ends);
    const range = torqueSlipRange(thread);
    if (!range)
      return [`${bolt}: its thread is not known, so ${newtonMetres(setNm)} was not checked for a slip.`];
    if (setNm >= range.lowNm && setNm <= range.highNm) return [];
    return [`${bolt}: ${newtonMetres(setNm)} is unusual for ${thread ?? ''}. Is it a slip?`];
  });
}

function threadOf(bolt: string, ends: readonly End[]): string | null {
  const name = bolt.trim().toLowerCase();
  return ends.find(({ end }) => name.startsWith(`${end} end`))?.thread ?? null;
}
