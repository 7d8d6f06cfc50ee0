import type { PlanView } from '@linkfell/contracts';
import { kPaPerPsi, tell, tellWork, type Judgement } from '@linkfell/fit-engine';

import { frameEndWords } from '../frames/mount-words.js';
import { frameName } from '../frames/sheet.js';
import type { Judged } from '../matches/judging.service.js';
import type { OpenMeasureUp } from '../measure-ups/measure-ups.service.js';
import { presentDrawing, sizeResult } from '../measure-ups/size-view.js';
import { drawnShock } from '../shocks/drawn-shock.js';
import type { WorkshopDay } from '../workshops/workshops.service.js';
import { cautions } from './cautions.js';
import type { JobSnapshot } from './prepared-order.js';

/** Work as lines for people; putting the shock in comes first. */
export function workLines({ work }: Judgement): PlanView['work'] {
  return [
    { id: 'fit-shock', say: tellWork({ id: 'fit-shock', end: null }), workshopOnly: false },
    ...work.map((need) => ({ id: need.id, say: tellWork(need), workshopOnly: need.workshopOnly })),
  ];
}

/** Why self-fit is not offered, or null when it is. */
export function selfFitReason(judgement: Judgement): string | null {
  const only = judgement.work.find(({ workshopOnly }) => workshopOnly);
  return only ? `${tellWork(only)} That is workshop work.` : null;
}

/** The spring in one line: "12.1 bar (175 psi), 27.5 % sag". */
export function springWords({ spring }: Judgement): string {
  if (!spring) return 'not known yet';
  const sag = spring.sagPercent === null ? '' : `, ${spring.sagPercent.toFixed(1)} % sag at the shock`;
  if (spring.kind === 'coil') return `${spring.rateLbPerIn} lb/in spring${sag}`;
  if (spring.gaugeKPa === null) return 'start from the shock maker’s table' + sag;
  return `${(spring.gaugeKPa / 100).toFixed(1)} bar (${Math.round(spring.gaugeKPa / kPaPerPsi)} psi)${sag}`;
}

const tools = (judgement: Judgement): string[] => [
  'Torque wrench',
  judgement.spring?.kind === 'air' ? 'Shock pump' : 'Collar spanner',
  'Rule for the sag',
  ...(judgement.work.some(({ id }) => id === 'press-in-kit' || id === 'press-in-reuse')
    ? ['Press tool']
    : []),
  ...(judgement.work.some(({ id }) => id === 'travel-spacer') ? ['Damper service tools'] : []),
];

/** What the order keeps for the mechanic. @param workshop whose minutes and prices count; null for self-fit */
export function jobSnapshot(judged: Judged, open: OpenMeasureUp, workshop: WorkshopDay | null): JobSnapshot {
  const { shock, judgement, entry } = judged;
  const { rider, frame, present } = open.side;
  const old = presentDrawing(open.side, sizeResult(open.side));
  const { spring } = judgement;
  return {
    bike: open.sheet ? frameName(open.sheet) + (rider.modelYear ? `, ${rider.modelYear}` : '') : frame.name,
    frameSheet: open.sheet
      ? `${frameName(open.sheet)}, version ${open.sheet.version}`
      : 'described by the rider',
    entry: entry
      ? `${entry.sizeKey ?? 'size from the present shock'}${entry.chip ? `, chip ${entry.chip}` : ''}`
      : '',
    oldShock: old
      ? `${old.eyeToEyeMm} x ${old.strokeMm ?? '?'}, ${present.spring ?? 'spring not told'}`
      : 'not described',
    newShock: `${shock.makerName} ${shock.modelName} ${shock.sizeKey}`,
    wayRound: judgement.wayRound === 'body-to-link' ? 'Body at the link' : 'Body at the frame',
    ends: (['frame', 'link'] as const).map((end) => {
      const at = end === 'frame' ? entry?.frameEnd : entry?.linkEnd;
      return {
        end,
        what: frameEndWords(at ?? null),
        thread: at?.thread ?? null,
        torqueNm: at?.torqueNm ?? null,
      };
    }),
    spring: {
      kind: shock.spring.kind,
      say: springWords(judgement),
      gaugePsi: spring?.gaugeKPa ? Math.round(spring.gaugeKPa / kPaPerPsi) : null,
      rateLbPerIn: spring?.rateLbPerIn ?? null,
      sag: spring?.sagMm ? `${spring.sagMm.toFixed(1)} mm at the shock` : 'not worked out',
    },
    parts: judgement.parts.map(({ name, end, quantity }) => ({ name, end, quantity })),
    work: workLines(judgement).map(({ id, say }) => {
      const service = workshop?.services.get(id);
      return { id, say, minutes: service?.minutes ?? 0, priceMinor: service?.priceMinor ?? 0 };
    }),
    tools: tools(judgement),
    cautions: [...cautions],
    selfFitAllowed: judgement.selfFitAllowed,
    selfFitReason: selfFitReason(judgement),
    riderWeight: rider.riderKg === null ? 'not told' : `${rider.riderKg} kg, kit ${rider.kitKg ?? 0} kg`,
    verdict: judgement.verdict,
    drawing: drawnShock(shock, judgement.reservoirPositionDeg),
  };
}

/** Why an item is in the plan. */
export function partNote(judgement: Judgement, itemId: string): string | null {
  const needs = judgement.parts.filter(({ partId }) => partId === itemId);
  const answer = judgement.answers.find(({ parts }) => parts.some(({ partId }) => partId === itemId));
  if (!answer || needs.length === 0) return null;
  const ends = needs.flatMap(({ end }) => (end ? [end === 'frame' ? 'Frame end.' : 'Link end.'] : []));
  const confirm = needs.some(({ confirmAtFitting }) => confirmAtFitting)
    ? ' To be confirmed at fitting.'
    : '';
  return `${[...ends, tell(answer).short].join(' ')}${confirm}`;
}
