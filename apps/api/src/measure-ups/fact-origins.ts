import type { QuestionKey } from '@linkfell/contracts';

/** Where each fact that a check reads comes from: a question of the measure-up, the frame sheet, or the catalogue. */
export type Origin = { question: QuestionKey } | { sheet: string } | { catalogue: string };

const asked = (question: QuestionKey): Origin => ({ question });

/** Every fact of the rider's side by its path. What begins with "shock." or "sale." is the catalogue's. */
export const factOrigins: Readonly<Record<string, Origin>> = {
  'frame.origin': asked('frame'),
  'frame.entries': { sheet: 'entries' },
  'frame.springStatement': { sheet: 'springStatement' },
  'frame.coilOnYoke': { sheet: 'coilOnYoke' },
  'frame.tunnelWidthMm': asked('tunnel-width'),
  'frame.reservoirStatement': { sheet: 'reservoirStatement' },
  'frame.reservoirRoom': asked('reservoir-room'),
  'frame.room': { sheet: 'room' },
  'frame.cableRouting': asked('cable-routing'),
  'frame.eBike': asked('e-bike'),
  'frame.riderLimit': { sheet: 'riderLimit' },
  'frame.wayRound': { sheet: 'wayRound' },
  'frame.refusedPositions': { sheet: 'refusedPositions' },
  'frame.sagTargetPercent': { sheet: 'sagTargetPercent' },
  'frame.notices': { sheet: 'notices' },
  'entry.sizeKey': { sheet: 'entries.sizeKey' },
  'entry.frameEnd': asked('frame-end'),
  'entry.linkEnd': asked('link-end'),
  'entry.travelMm': asked('frame-travel'),
  'entry.curve': { sheet: 'entries.curve' },
  'entry.modelYears': { sheet: 'entries.modelYears' },
  'entry.frameSizes': { sheet: 'entries.frameSizes' },
  'entry.chip': { sheet: 'entries.chip' },
  'entry.source': { sheet: 'entries.source' },
  'present.printedSizeKey': asked('printed-size'),
  'present.eyeToEye': asked('eye-to-eye'),
  'present.compressed': asked('stroke'),
  'present.shaftTravel': asked('stroke'),
  'present.bodyEndKind': asked('mounts'),
  'present.shaftEndKind': asked('mounts'),
  'present.frameEndHardware': asked('hardware'),
  'present.linkEndHardware': asked('hardware'),
  'present.diameterMm': asked('can-diameter'),
  'present.spring': asked('present-spring'),
  'present.remoteAction': asked('present-remote'),
  'present.remoteLine': asked('present-remote'),
  'present.soldWithBike': asked('sold-with-bike'),
  'rider.riderKg': asked('weight'),
  'rider.kitKg': asked('weight'),
  'rider.bikeKg': asked('bike-mass'),
  'rider.style': asked('style'),
  'rider.modelYear': asked('frame'),
  'rider.frameSize': asked('frame'),
  'rider.chip': asked('frame'),
  'rider.wantsRemote': asked('remote-wish'),
  'rider.acceptsExternalRouting': asked('remote-wish'),
  'rider.confirmsSheetSize': asked('size-confirm'),
  'rider.fillingHeightM': asked('place'),
};

/** The question that would settle a fact, or null when only a maker or a workshop can. */
export function questionForFact(fact: string): QuestionKey | null {
  const origin = factOrigins[fact];
  return origin && 'question' in origin ? origin.question : null;
}
