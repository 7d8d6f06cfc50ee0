import type { AnswerValue, QuestionKey } from '@linkfell/contracts';
import type {
  Fact,
  FrameEnd,
  FrameFacts,
  FrameMount,
  HardwareSeen,
  PresentShock,
  RiderFacts,
  Source,
  Tool,
} from '@linkfell/fit-engine';

import { frameFactsOf, type FrameSheetData } from '../frames/sheet.js';
import { known, type Answers } from './answers.js';
import { frameReadingUncertainty } from './reading-uncertainty.js';

export interface RiderSide {
  frame: FrameFacts;
  present: PresentShock;
  rider: RiderFacts;
}

/** Height of the filling place when the rider has not said, m above sea level: about that of the district's towns. */
const usualHeightM = 200;

const toolWords: Record<Tool, string> = {
  print: 'read off the print',
  caliper: 'with a caliper',
  ruler: 'with a steel ruler',
  tape: 'with a tape',
};

function riderSource(answers: Answers, key: QuestionKey, tool?: Tool): Source {
  return {
    kind: 'rider',
    label: tool ? `You, ${toolWords[tool]}` : 'Your answer',
    date: answers.days[key] ?? null,
  };
}

function fact<K extends QuestionKey, T>(
  answers: Answers,
  key: K,
  value: (answer: AnswerValue<K>) => T | null,
  tool?: (answer: AnswerValue<K>) => Tool,
): Fact<T> {
  const answer = known(answers, key);
  const found = answer === null ? null : value(answer);
  return answer === null || found === null
    ? null
    : { value: found, source: riderSource(answers, key, tool?.(answer)) };
}

function describedEnd(answers: Answers, key: 'frame-end' | 'link-end'): FrameEnd | null {
  const answer = known(answers, key);
  if (!answer) return null;
  const yoke = known(answers, 'frame-yoke');
  const tool = answer.kind === 'trunnion' ? undefined : answer.tool;
  return {
    mount: mountOf(answer),
    yoke: yoke && yoke.yoke === key,
    thread: null,
    torqueNm: null,
    uncertaintyMm: tool ? frameReadingUncertainty(tool) : 0,
    source: riderSource(answers, key, tool),
  };
}

function mountOf(answer: AnswerValue<'frame-end'>): FrameMount {
  switch (answer.kind) {
    case 'hardware':
      return { kind: 'hardware', widthMm: answer.widthMm, boltMm: answer.boltMm };
    case 'pin':
      return { kind: 'pin', diameterMm: answer.diameterMm, widthMm: answer.widthMm };
    case 'bearing-bolt':
      return { kind: 'bearing-bolt', boltMm: answer.boltMm, widthMm: answer.widthMm };
    case 'trunnion':
      return { kind: 'trunnion' };
  }
}

const roomFact = (answers: Answers): FrameFacts['reservoirRoom'] =>
  fact(
    answers,
    'reservoir-room',
    // "No room" is a room of nothing: no reservoir fits in it, whatever the uncertainty.
    (answer) =>
      answer.kind === 'none'
        ? { diameterMm: 0, lengthMm: 0, uncertaintyMm: 0 }
        : {
            diameterMm: answer.diameterMm,
            lengthMm: answer.lengthMm,
            uncertaintyMm: frameReadingUncertainty(answer.tool),
          },
    (answer) => (answer.kind === 'measured' ? answer.tool : 'ruler'),
  );

/** A frame that nobody listed: one entry without a size, everything else as the rider says. */
function describedFrame(answers: Answers): FrameFacts {
  const described = known(answers, 'frame');
  return {
    origin: 'described',
    id: 'described',
    name: described?.kind === 'described' ? described.name : 'Your bike',
    sheetVersion: null,
    entries: [
      {
        id: 'described',
        sizeKey: null,
        frameEnd: describedEnd(answers, 'frame-end'),
        linkEnd: describedEnd(answers, 'link-end'),
        travelMm: known(answers, 'frame-travel')?.mm ?? null,
        curve: null,
        modelYears: null,
        frameSizes: null,
        chip: null,
        source: riderSource(answers, 'frame'),
      },
    ],
    springStatement: null,
    coilOnYoke: null,
    tunnelWidthMm: tunnelFact(answers),
    reservoirStatement: null,
    reservoirRoom: roomFact(answers),
    room: null,
    cableRouting: fact(answers, 'cable-routing', (answer) => answer.routing),
    eBike: fact(answers, 'e-bike', (answer) => answer.eBike),
    riderLimit: null,
    wayRound: null,
    refusedPositions: null,
    sagTargetPercent: null,
    notices: [],
  };
}

const tunnelFact = (answers: Answers): Fact<number> =>
  fact(
    answers,
    'tunnel-width',
    // A tunnel read too wide would let a wide can in: count the narrow end of two uncertainties.
    (answer) => answer.mm - 2 * frameReadingUncertainty(answer.tool),
    (answer) => answer.tool,
  );

/** A listed frame: the sheet's own word, the rider's only where the sheet is silent. */
function listedFrame(answers: Answers, sheet: FrameSheetData): FrameFacts {
  const frame = frameFactsOf(sheet);
  return {
    ...frame,
    tunnelWidthMm: frame.tunnelWidthMm ?? tunnelFact(answers),
    reservoirRoom: frame.reservoirRoom ?? roomFact(answers),
    cableRouting: frame.cableRouting ?? fact(answers, 'cable-routing', (answer) => answer.routing),
    eBike: frame.eBike ?? fact(answers, 'e-bike', (answer) => answer.eBike),
  };
}

function seen(end: AnswerValue<'hardware'>['frameEnd']): HardwareSeen | null {
  return end && { boreMm: end.boreMm, widthMm: end.widthMm, boltMm: end.boltMm, sound: end.sound };
}

function presentShock(answers: Answers): PresentShock {
  const stroke = known(answers, 'stroke');
  const mounts = known(answers, 'mounts');
  const hardware = known(answers, 'hardware');
  const remote = known(answers, 'present-remote');
  const sold = answers.values['sold-with-bike'];
  const eyeToEye = known(answers, 'eye-to-eye');
  const read = (reading: { mm: number; tool: Tool; awkward: boolean } | null | undefined) =>
    reading ? { mm: reading.mm, tool: reading.tool, awkward: reading.awkward } : null;
  return {
    printedSizeKey: known(answers, 'printed-size')?.sizeKey ?? null,
    eyeToEye: read(eyeToEye),
    compressed: stroke?.method === 'compressed' ? read(stroke.reading) : null,
    shaftTravel: stroke?.method === 'shaft' ? read(stroke.reading) : null,
    bodyEndKind: mounts?.bodyEnd ?? null,
    shaftEndKind: mounts?.shaftEnd ?? null,
    frameEndHardware: seen(hardware?.frameEnd ?? null),
    linkEndHardware: seen(hardware?.linkEnd ?? null),
    diameterMm: known(answers, 'can-diameter')?.mm ?? null,
    spring: known(answers, 'present-spring')?.spring ?? null,
    remoteAction: remote?.action ?? null,
    remoteLine: remote?.line ?? null,
    soldWithBike:
      sold?.state === 'unknown' ? 'unsure' : (known(answers, 'sold-with-bike')?.soldWithBike ?? null),
  };
}

function riderFacts(answers: Answers): RiderFacts {
  const frame = known(answers, 'frame');
  const listed = frame?.kind === 'listed' ? frame : null;
  const weight = known(answers, 'weight');
  const remote = known(answers, 'remote-wish');
  return {
    riderKg: weight?.riderKg ?? null,
    kitKg: weight?.kitKg ?? null,
    bikeKg: known(answers, 'bike-mass')?.kg ?? null,
    style: known(answers, 'style')?.style ?? null,
    modelYear: listed?.modelYear ?? null,
    frameSize: listed?.frameSize ?? null,
    chip: listed?.chip ?? null,
    springWish: known(answers, 'spring-wish')?.wish ?? 'either',
    reservoirWish: known(answers, 'reservoir-wish')?.wish ?? 'either',
    wantsRemote: remote?.wants ?? null,
    acceptsExternalRouting: remote?.acceptsExternal ?? null,
    confirmsSheetSize: known(answers, 'size-confirm')?.confirmsSheetSize ?? false,
    fillingHeightM: known(answers, 'place')?.heightM ?? usualHeightM,
  };
}

/** What the engine is told of the rider's side. Pure: the same answers and sheet give the same facts. */
export function factsFromAnswers(answers: Answers, sheet: FrameSheetData | null): RiderSide {
  return {
    frame: sheet ? listedFrame(answers, sheet) : describedFrame(answers),
    present: presentShock(answers),
    rider: riderFacts(answers),
  };
}
