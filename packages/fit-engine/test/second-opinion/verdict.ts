import type { FitQuestion, FrameEnd, SheetEntry, ShockMount } from '../../src/facts.js';
import { rowOf, settled } from './sizes.js';
import { airKind, coilKind } from './springs.js';
import { TooClose, type Kind } from './kinds.js';
import { roomKind } from './room.js';

export const order: readonly Kind[] = ['pass', 'work', 'unknown', 'fail'];
export const worse = (a: Kind, b: Kind): Kind => (order.indexOf(a) >= order.indexOf(b) ? a : b);
export type Kinds = Record<string, Kind>;
type Way = 'body-to-frame' | 'body-to-link';

const sure = <T>(value: T | 'close'): T => {
  if (value === 'close') throw new TooClose();
  return value;
};

const other = (entry: SheetEntry, { rider }: FitQuestion): boolean =>
  Boolean(
    (entry.modelYears &&
      rider.modelYear !== null &&
      (rider.modelYear < entry.modelYears.from || rider.modelYear > entry.modelYears.to)) ||
    (entry.frameSizes && rider.frameSize !== null && !entry.frameSizes.includes(rider.frameSize)) ||
    (entry.chip && rider.chip !== null && entry.chip !== rider.chip),
  );

/** Whether another entry that may be the bike's differs, and only something the rider has not said tells which. */
function depends(entry: SheetEntry, q: FitQuestion): boolean {
  const text = (e: SheetEntry): string =>
    JSON.stringify([
      e.sizeKey,
      e.travelMm,
      e.curve,
      ...[e.frameEnd, e.linkEnd].map((end) => [end?.mount, end?.yoke]),
    ]);
  return q.frame.entries.some((rival) => {
    if (rival === entry || other(rival, q) || text(rival) === text(entry)) return false;
    const apart = (a: unknown, b: unknown): boolean => JSON.stringify(a) !== JSON.stringify(b);
    return (
      (q.rider.modelYear === null && apart(rival.modelYears, entry.modelYears)) ||
      (q.rider.frameSize === null && apart(rival.frameSizes, entry.frameSizes)) ||
      (q.rider.chip === null && apart(rival.chip, entry.chip))
    );
  });
}

function sizes(q: FitQuestion, entry: SheetEntry, mine: string | null): [Kind, Kind] {
  const { frame, shock, present } = q;
  const described = frame.origin === 'described';
  if (described && (!mine || present.soldWithBike !== 'yes')) return ['unknown', 'unknown'];
  if (!described && (!entry.sizeKey || other(entry, q))) return ['unknown', 'unknown'];
  const wanted = described ? mine : entry.sizeKey;
  const [own, theirs] = [rowOf(wanted ?? ''), rowOf(shock.sizeKey)];
  if (!own || !theirs) return ['unknown', 'unknown'];
  const best: Kind = described ? 'work' : 'pass';
  const spacer = shock.spacedToKeys.includes(own[0]) && own[2] === theirs[2] && own[3] < theirs[3];
  if (own[0] !== theirs[0] && !spacer) {
    return [own[2] === theirs[2] ? 'pass' : 'fail', own[3] === theirs[3] ? 'pass' : 'fail'];
  }
  if (!described && depends(entry, q)) return [best, 'unknown'];
  return [best, own[0] === theirs[0] ? best : 'work'];
}

function mount({ mount: m, uncertaintyMm: u }: FrameEnd, eye: ShockMount): Kind {
  const needs = { hardware: 'eyelet', pin: 'eyelet', 'bearing-bolt': 'bearing-eye', trunnion: 'trunnion' }[
    m.kind
  ];
  if (eye.kind !== needs) return 'fail';
  const pairs: [number | null, number][] = [];
  if (m.kind === 'pin' && eye.kind === 'eyelet') pairs.push([m.diameterMm, eye.boreMm]);
  if (m.kind === 'bearing-bolt' && eye.kind === 'bearing-eye')
    pairs.push([m.boltMm, eye.boltMm], [m.widthMm, eye.widthMm]);
  const kinds = pairs.map(([a, b]): Kind => {
    if (a === null) return 'unknown';
    const apart = Math.abs(a - b);
    if (u === 0) return apart < 0.01 ? 'pass' : 'fail';
    if (apart > 4 * u) return 'fail';
    return u <= 0.6 && apart <= 2 * u ? 'work' : 'unknown';
  });
  return kinds.reduce(worse, 'pass');
}

function hardware(q: FitQuestion, end: FrameEnd | null, which: 'frame' | 'link', eye: ShockMount): Kind {
  if (!end) return 'unknown';
  if (end.mount.kind !== 'hardware' || eye.kind !== 'eyelet') return 'pass';
  const { widthMm: w, boltMm: b } = end.mount;
  if (w === null || b === null) return 'unknown';
  const u2 = 2 * end.uncertaintyMm;
  const near = (x: number, y: number, d: number): boolean => Math.abs(x - y) <= d + 1e-9;
  const old = which === 'frame' ? q.present.frameEndHardware : q.present.linkEndHardware;
  if (old?.sound && old.boreMm !== null && near(old.boreMm, eye.boreMm, 0.1)) {
    if (near(old.widthMm, w, Math.max(0.5, u2)) && near(old.boltMm, b, Math.max(0.3, u2))) return 'work';
  }
  const kits = q.sale.kits.filter(
    (kit) => near(kit.boreMm, eye.boreMm, 0.01) && near(kit.widthMm, w, u2) && near(kit.boltMm, b, u2),
  );
  return new Set(kits.map((kit) => `${kit.widthMm}x${kit.boltMm}`)).size === 1 ? 'work' : 'unknown';
}

function weight({ rider, frame, shock }: FitQuestion): Kind {
  const { riderKg: r, kitKg: k, bikeKg: b } = rider;
  const one = (limit: (typeof frame)['riderLimit']): Kind => {
    if (!limit) return 'pass';
    const within = (...kgs: (number | null)[]): Kind => {
      if (kgs.includes(null)) return 'unknown';
      return kgs.reduce<number>((sum, kg) => sum + (kg ?? 0), 0) <= limit.value.kg ? 'pass' : 'fail';
    };
    const { basis } = limit.value;
    if (basis === 'rider') return within(r);
    if (basis === 'rider-and-kit') return within(r, k);
    if (basis === 'with-bike') return within(r, k, b);
    const usual = within(r, k);
    return usual === 'pass' && within(r, k, b) !== 'pass' ? 'unknown' : usual;
  };
  return worse(one(frame.riderLimit), one(shock.riderLimit));
}

function remote({ rider, shock, frame, present, sale }: FitQuestion): Kind {
  const has = shock.remote;
  if (rider.wantsRemote === null) return 'unknown';
  if (!rider.wantsRemote) {
    if (!has || has.action === 'pull-to-lock') return 'pass';
    return has.holdOpenPartId !== null && sale.otherPartIds.includes(has.holdOpenPartId) ? 'work' : 'fail';
  }
  if (!has) return 'fail';
  const inside = frame.cableRouting && frame.cableRouting.value !== 'none';
  if (!inside && !rider.acceptsExternalRouting) return 'unknown';
  const own = present.remoteAction === has.action && present.remoteLine === has.line;
  if (!own && !sale.remotes.some((r) => r.action === has.action && r.line === has.line)) return 'unknown';
  return own && inside ? 'pass' : 'work';
}

function diameter({ frame, shock, present }: FitQuestion): Kind {
  if (frame.tunnelWidthMm) return frame.tunnelWidthMm.value - shock.diameterMm > 3.9999 ? 'pass' : 'fail';
  const like = present.spring === shock.spring.kind && present.bodyEndKind === shock.bodyEnd.kind;
  return like && present.diameterMm !== null && shock.diameterMm <= present.diameterMm ? 'pass' : 'unknown';
}

function coilOnYoke({ frame, shock }: FitQuestion, entry: SheetEntry): Kind {
  const yokes = [entry.frameEnd?.yoke ?? null, entry.linkEnd?.yoke ?? null];
  if (shock.spring.kind === 'air' || yokes.every((yoke) => yoke === false)) return 'pass';
  if (frame.coilOnYoke?.value === 'refused') return 'fail';
  return frame.coilOnYoke && yokes.includes(true) ? 'pass' : 'unknown';
}

function springType({ frame, shock }: FitQuestion): Kind {
  const word = frame.springStatement?.value;
  if (word === 'air-and-coil' || word === `${shock.spring.kind}-only`) return 'pass';
  return word ? 'fail' : shock.spring.kind === 'air' ? 'pass' : 'unknown';
}

function eBike({ frame, shock }: FitQuestion): Kind {
  if (frame.eBike?.value === false || shock.eBikeApproved?.value === true) return 'pass';
  return frame.eBike && shock.eBikeApproved ? 'fail' : 'unknown';
}

/** Every check of one way of putting a shock in, written a second time from the rules of the trade. */
export function kindsOf(q: FitQuestion, entry: SheetEntry, way: Way): Kinds {
  const { frame, shock, rider } = q;
  const mine = sure(settled(frame, q.present));
  const [eye, stroke] = sizes(q, entry, mine);
  const travel = rowOf(entry.sizeKey ?? mine ?? shock.sizeKey)?.[3] ?? NaN;
  const [atFrame, atLink] =
    way === 'body-to-frame' ? [shock.bodyEnd, shock.shaftEnd] : [shock.shaftEnd, shock.bodyEnd];
  const ends = [
    [entry.frameEnd, 'frame', atFrame],
    [entry.linkEnd, 'link', atLink],
  ] as const;
  const live = frame.entries.filter((one) => !other(one, q));
  const listed = (live.length > 0 ? live : frame.entries).map((one) => one.sizeKey);
  const disagrees = frame.origin === 'sheet' && mine !== null && !listed.includes(mine);
  const rules = [frame.wayRound, shock.wayRound].filter((rule) => rule !== null);
  return {
    'eye-to-eye': eye,
    stroke,
    mounts: ends.map(([end, , at]) => (end ? mount(end, at) : 'unknown')).reduce(worse),
    hardware: ends.map(([end, which, at]) => hardware(q, end, which, at)).reduce(worse),
    'spring-type': springType(q),
    'coil-on-yoke': coilOnYoke(q, entry),
    'spring-rate': sure(coilKind(q, entry, travel)),
    pressure: sure(airKind(q, entry, travel)),
    'rider-weight': weight(q),
    reservoir: roomKind(q, entry, way),
    diameter: diameter(q),
    remote: remote(q),
    position: rules.every((rule) => rule.value === way) ? 'pass' : 'fail',
    'e-bike': eBike(q),
    notices: [...frame.notices, ...shock.notices].some((n) => n.effect === 'stop') ? 'fail' : 'pass',
    'reading-conflict': disagrees && !rider.confirmsSheetSize ? 'unknown' : 'pass',
  };
}

export const worstOf = (kinds: Kinds): Kind => Object.values(kinds).reduce(worse, 'pass');

/** The best of all entries that may be the bike's, both ways round. */
export function secondOpinion(q: FitQuestion): Kind {
  const live = q.frame.entries.filter((entry) => !other(entry, q));
  const all = (live.length > 0 ? live : q.frame.entries).flatMap((entry) =>
    (['body-to-frame', 'body-to-link'] as const).map((way) => worstOf(kindsOf(q, entry, way))),
  );
  return all.reduce((a, b) => (order.indexOf(a) <= order.indexOf(b) ? a : b));
}
