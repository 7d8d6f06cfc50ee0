import type { CheckId } from '../answers.js';

const readings = [
  'present.printedSizeKey',
  'present.eyeToEye',
  'present.compressed',
  'present.shaftTravel',
  'present.bodyEndKind',
  'present.shaftEndKind',
] as const;
/** The size of the present shock is resolved against the sizes and mounts of the frame. */
const presentSize = [
  ...readings,
  'frame.origin',
  'frame.entries',
  'entry.sizeKey',
  'entry.frameEnd',
  'entry.linkEnd',
] as const;
/** Which entry of a sheet speaks for the rider's bike, and whether its figures matter. */
const whichEntry = [
  'entry.modelYears',
  'entry.frameSizes',
  'entry.chip',
  'entry.travelMm',
  'entry.curve',
  'rider.modelYear',
  'rider.frameSize',
  'rider.chip',
] as const;
const size = [
  ...presentSize,
  ...whichEntry,
  'present.soldWithBike',
  'shock.sizeKey',
  'shock.spacedToKeys',
] as const;
const ride = [
  ...presentSize,
  'entry.travelMm',
  'entry.curve',
  'frame.sagTargetPercent',
  'rider.riderKg',
  'rider.kitKg',
  'rider.bikeKg',
  'rider.style',
  'rider.fillingHeightM',
  'shock.sizeKey',
  'shock.spring',
] as const;
const ends = ['entry.frameEnd', 'entry.linkEnd', 'shock.bodyEnd', 'shock.shaftEnd'] as const;

/**
 * The facts that each check reads, as paths: "entry" is a line of the frame's sheet, "shock" and "sale" are the
 * catalogue's. Where a figure came from ("source") is shown and never judged, so it is not listed. A test records what
 * the checks really read.
 */
export const factsRead: Readonly<Record<CheckId, readonly string[]>> = {
  'eye-to-eye': size,
  stroke: size,
  mounts: ends,
  hardware: [...ends, 'present.frameEndHardware', 'present.linkEndHardware', 'sale.kits'],
  'spring-type': ['frame.springStatement', 'shock.spring'],
  'coil-on-yoke': [...ends, 'frame.coilOnYoke', 'shock.spring'],
  'spring-rate': [...ride, 'sale.coils'],
  pressure: [...ride, 'shock.diameterMm'],
  'rider-weight': ['frame.riderLimit', 'shock.riderLimit', 'rider.riderKg', 'rider.kitKg', 'rider.bikeKg'],
  reservoir: [
    'frame.reservoirStatement',
    'frame.refusedPositions',
    'frame.room',
    'frame.reservoirRoom',
    'entry.sizeKey',
    'shock.sizeKey',
    'shock.reservoir',
  ],
  diameter: [
    'frame.tunnelWidthMm',
    'present.diameterMm',
    'present.spring',
    'present.bodyEndKind',
    'shock.diameterMm',
    'shock.spring',
    'shock.bodyEnd',
  ],
  remote: [
    'rider.wantsRemote',
    'rider.acceptsExternalRouting',
    'frame.cableRouting',
    'present.remoteAction',
    'present.remoteLine',
    'shock.remote',
    'sale.remotes',
    'sale.otherPartIds',
  ],
  position: ['frame.wayRound', 'shock.wayRound'],
  'e-bike': ['frame.eBike', 'shock.eBikeApproved'],
  notices: ['frame.notices', 'shock.notices'],
  'reading-conflict': [...presentSize, ...whichEntry, 'rider.confirmsSheetSize'],
};
