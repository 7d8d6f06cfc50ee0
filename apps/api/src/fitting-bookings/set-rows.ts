import type { FittingRecordBody } from '@linkfell/contracts';
import { kPaPerPsi } from '@linkfell/fit-engine';

/** What was set, as rows of a mail; every figure with its unit. @param strokeMm of the shock, for the sag in percent; null where it is not known */
export function setRows(record: FittingRecordBody, strokeMm: number | null): [string, string][] {
  const { spring, sagMm } = record;
  const percent = strokeMm === null ? '' : `, ${((100 * sagMm) / strokeMm).toFixed(1)} % of the stroke`;
  return [
    ['Serial number', record.serialNumber],
    spring.kind === 'air'
      ? [
          'Air pressure',
          `${((spring.gaugePsi * kPaPerPsi) / 100).toFixed(1)} bar (${spring.gaugePsi} psi) above the air outside`,
        ]
      : ['Spring', `${spring.rateLbPerIn} lb/in, ${spring.preloadTurns} turns of preload`],
    ['Sag at the shock', `${sagMm} mm${percent}`],
    ...record.torques.map(({ bolt, setNm }): [string, string] => [bolt, `${setNm} N m`]),
    ...(record.notes ? [['Notes', record.notes] as [string, string]] : []),
  ];
}
