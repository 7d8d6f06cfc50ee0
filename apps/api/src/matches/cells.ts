import type { CellView, MatchRow } from '@linkfell/contracts';
import {
  figureText,
  tell,
  type CheckAnswer,
  type CheckId,
  type Judgement,
  type SheetEntry,
  type ShockFacts,
} from '@linkfell/fit-engine';

import { mountWord } from '../frames/mount-words.js';

type Cells = MatchRow['cells'];

const columns: ReadonlySet<CheckId> = new Set([
  'eye-to-eye',
  'stroke',
  'mounts',
  'hardware',
  'spring-rate',
  'pressure',
  'reservoir',
  'remote',
]);

/** The columns of the fitting sheet: short words where all is well, the reason where it is not. */
export function cellsOf(shock: ShockFacts, judgement: Judgement, entry: SheetEntry | null): Cells {
  const by = new Map(judgement.answers.map((given) => [given.check, given]));
  const given = (check: CheckId): CheckAnswer | undefined => by.get(check);
  const cell = (check: CheckId, text: string, sub: string | null = null): CellView => {
    const found = given(check);
    const answer = found?.answer ?? 'pass';
    return { text, sub: answer === 'pass' || !found ? sub : (sub ?? tell(found).short), answer };
  };
  const [eyeToEye, stroke] = shock.sizeKey.split('x');
  const kitNames = judgement.parts.filter((part) => part.kind === 'kit').map((part) => part.name);
  return {
    eyeToEye: cell('eye-to-eye', eyeToEye ?? shock.sizeKey),
    stroke: cell('stroke', stroke ?? ''),
    mounts: cell(
      'mounts',
      `${endWord(shock, entry, 'frame', judgement)} / ${endWord(shock, entry, 'link', judgement)}`,
    ),
    hardware: cell(
      'hardware',
      hardwareWord(given('hardware')),
      kitNames.length > 0 ? kitNames.join(', ') : null,
    ),
    spring: springCell(judgement, given(shock.spring.kind === 'coil' ? 'spring-rate' : 'pressure')),
    reservoir: cell('reservoir', reservoirWord(shock, given('reservoir'))),
    remote: cell('remote', remoteWord(shock, given('remote'))),
    others: judgement.answers
      .filter(({ check, answer }) => !columns.has(check) && answer !== 'pass')
      .map((found) => ({ check: found.check, text: tell(found).short, sub: null, answer: found.answer })),
  };
}

function endWord(
  shock: ShockFacts,
  entry: SheetEntry | null,
  end: 'frame' | 'link',
  { wayRound }: Judgement,
): string {
  const frameEnd = end === 'frame' ? entry?.frameEnd : entry?.linkEnd;
  const bodyHere = (wayRound === 'body-to-frame') === (end === 'frame');
  const own = mountWord(bodyHere ? shock.bodyEnd.kind : shock.shaftEnd.kind);
  return frameEnd && frameEnd.mount.kind !== 'hardware' ? mountWord(frameEnd.mount.kind) : own;
}

function hardwareWord(found: CheckAnswer | undefined): string {
  switch (found?.code) {
    case 'hardware-kit':
      return found.parts.length === 1 ? 'one kit added' : `${found.parts.length} kits added`;
    case 'hardware-reuse':
      return 'yours moves across';
    case 'hardware-none-needed':
      return 'none needed';
    case 'hardware-none-on-sale':
      return 'none on sale';
    case undefined:
      return '–';
    default:
      return 'not known';
  }
}

function springCell(judgement: Judgement, found: CheckAnswer | undefined): CellView {
  const answer = found?.answer ?? 'pass';
  const { spring } = judgement;
  const sag = spring?.sagPercent ? `${spring.sagPercent.toFixed(1)} % sag` : null;
  if (answer === 'fail' || answer === 'unknown' || !spring) {
    return {
      text: answer === 'unknown' ? 'not known' : 'outside limits',
      sub: found ? tell(found).short : null,
      answer,
    };
  }
  if (spring.kind === 'coil') return { text: `${spring.rateLbPerIn} lb/in, added`, sub: sag, answer };
  if (spring.gaugeKPa === null) return { text: 'see maker’s table', sub: sag, answer };
  const pressure = found?.figures.find((figure) => figure.key === 'computed.pressure');
  return { text: pressure ? figureText(pressure) : '–', sub: sag, answer };
}

function reservoirWord(shock: ShockFacts, found: CheckAnswer | undefined): string {
  if (!shock.reservoir) return 'inline';
  switch (found?.code) {
    case 'reservoir-not-stated':
      return 'room not stated';
    case 'reservoir-clears':
    case 'reservoir-clears-narrowly': {
      const room = found.figures.find((figure) => figure.key === 'computed.clearance');
      return room ? `${figureText(room)} free` : 'fits';
    }
    case 'reservoir-stated':
    case 'reservoir-room-measured':
      return 'fits';
    default:
      return 'reservoir';
  }
}

function remoteWord(shock: ShockFacts, found: CheckAnswer | undefined): string {
  if (!shock.remote) return 'none';
  return found?.code === 'remote-lever-added' ? 'lever added' : shock.remote.action.replaceAll('-', ' ');
}
