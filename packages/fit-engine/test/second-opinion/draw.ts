import type { CheckId } from '../../src/answers.js';
import type { FitQuestion } from '../../src/facts.js';
import type { Random } from '../judging/seeded.js';
import { around, coil, ends, measured, type Draw } from './draw-around.js';
import { drawRoom } from './draw-room.js';
import { change as set } from './change.js';
import { fact, frameEnd, manual, matching } from './question.js';

const both = (q: FitQuestion, path: string, value: unknown): FitQuestion =>
  set(set(q, `frame.entries.0.frameEnd.${path}`, value), `frame.entries.0.linkEnd.${path}`, value);
const seen = (r: Random) => ({
  boreMm: r.pick([15, 15, 15.05, 12.7, null]),
  widthMm: r.pick([30, 35, 35, 35.4]),
  boltMm: r.pick([8, 8, 8.2, 10]),
  sound: r.pick([true, true, false, null, null]),
});

/** One disturbance per check: something that this check, and where it can be only this one, has to answer. */
const disturb: Record<CheckId, Draw> = {
  'eye-to-eye': (q, r) => {
    // Two lengths that share their strokes leave nothing but the length to object.
    const pair = r.pick([
      ['210x55', '185x55'],
      ['210x52.5', '185x52.5'],
      ['190x45', '165x45'],
      ['230x60', '205x60'],
      ['210x55', '185x52.5'],
      ['210x55', '230x60'],
    ] as const);
    const [own, theirs] = r.chance(0.5) ? pair : [pair[1], pair[0]];
    const sized = q.frame.entries[0]?.sizeKey === '210x55' ? set(q, 'frame.entries.0.sizeKey', own) : q;
    return set(sized, 'shock.sizeKey', theirs);
  },
  stroke: (q, r) =>
    set(
      set(q, 'shock.sizeKey', r.pick(['210x52.5', '210x50', '210x55'])),
      'shock.spacedToKeys',
      r.pick([[], ['210x50'], ['210x55', '210x52.5', '210x50']]),
    ),
  mounts: (q, r) => {
    const [mount] = r.pick(ends);
    const where = r.pick(['frameEnd', 'linkEnd']);
    if (r.chance(0.1)) return set(q, `frame.entries.0.${where}`, null);
    const lengths = r.pick([
      mount,
      { kind: 'pin' as const, diameterMm: r.pick([null, 14.4, 15.3, 15]), widthMm: 24 },
    ]);
    return set(
      q,
      `frame.entries.0.${where}`,
      frameEnd(lengths, { uncertaintyMm: r.pick([0, 0, 0.25, 0.56, 1.2]) }),
    );
  },
  hardware: (q, r) => {
    const mount = {
      kind: 'hardware',
      widthMm: r.pick([null, 30, 30.3, 35, 35, 40]),
      boltMm: r.pick([null, 8, 8, 8, 10]),
    };
    const u = r.pick([0, 0.25, 0.56]);
    const one = r.pick(['frameEnd', 'linkEnd']);
    const done = r.chance(0.5)
      ? both(both(q, 'mount', mount), 'uncertaintyMm', u)
      : set(set(q, `frame.entries.0.${one}.mount`, mount), `frame.entries.0.${one}.uncertaintyMm`, u);
    const eyes = set(set(done, 'shock.bodyEnd', ends[0]?.[1]), 'shock.shaftEnd', ends[0]?.[1]);
    const old = set(eyes, 'present.frameEndHardware', r.pick([null, seen(r)]));
    return set(old, 'present.linkEndHardware', r.pick([null, seen(r)]));
  },
  'spring-type': (q, r) =>
    set(
      r.chance(0.5) ? coil(q, r) : q,
      'frame.springStatement',
      r.pick([null, fact('air-only'), fact('coil-only')]),
    ),
  'coil-on-yoke': (q, r) => {
    const yoked = set(
      coil(q, r),
      `frame.entries.0.${r.pick(['frameEnd', 'linkEnd'])}.yoke`,
      r.pick([null, true]),
    );
    return set(yoked, 'frame.coilOnYoke', r.pick([null, fact('allowed'), fact('refused')]));
  },
  'spring-rate': (q, r) => {
    const heavy = set(coil(q, r), 'rider.riderKg', r.pick([null, 30, 50, 90, 115]));
    // Springs too short for the stroke with its preload, or just long enough.
    const travelMm = r.pick([68, 55, 56, 56.5]);
    return set(
      heavy,
      'sale.coils',
      q.sale.coils.map((one) => ({ ...one, travelMm })),
    );
  },
  pressure: (q, r) => {
    const spring = {
      kind: 'air',
      minGaugeKPa: r.pick([300, 300, 900, 1300, null]),
      maxGaugeKPa: r.chance(0.1) ? null : r.between(500, 2000),
    };
    const volumes = {
      areaMm2: r.pick([900, 1100]),
      negativeAreaMm2: 850,
      volumeMm3: 105000,
      negativeVolumeMm3: 16000,
    };
    return set(q, 'shock.spring', { ...spring, chambers: r.chance(0.4) ? null : fact(volumes) });
  },
  'rider-weight': (q, r) => {
    const limit = {
      kg: r.pick([78, 82, 85, 95, 97]),
      basis: r.pick(['rider', 'rider-and-kit', 'with-bike', null] as const),
    };
    return set(q, r.pick(['shock.riderLimit', 'frame.riderLimit']), fact(limit));
  },
  reservoir: drawRoom,
  diameter: (q, r) => {
    const tunnel = set(q, 'frame.tunnelWidthMm', r.pick([null, null, fact(60), fact(59.9)]));
    const mine = set(tunnel, 'present.diameterMm', r.pick([null, 55, 56, 60]));
    return set(
      set(mine, 'present.spring', r.pick([null, 'air', 'coil'])),
      'present.bodyEndKind',
      r.pick([null, 'eyelet', 'trunnion']),
    );
  },
  remote: (q, r) => {
    const has = {
      action: r.pick(['pull-to-lock', 'pull-to-open']),
      line: r.pick(['cable', 'hydraulic']),
      holdOpenPartId: r.pick([null, 'hold-1', 'gone']),
    };
    const wish = set(
      set(q, 'rider.wantsRemote', r.pick([null, true, true, false])),
      'shock.remote',
      r.pick([null, has, has, has]),
    );
    const own = set(
      set(wish, 'present.remoteAction', r.pick([null, 'none', has.action])),
      'present.remoteLine',
      has.line,
    );
    const routed = set(
      own,
      'frame.cableRouting',
      r.pick([null, fact('internal'), fact('external'), fact('none')]),
    );
    return set(routed, 'rider.acceptsExternalRouting', r.pick([null, true, false]));
  },
  position: (q, r) => {
    const rule = () => r.pick([null, fact('body-to-frame'), fact('body-to-link')]);
    return set(set(q, 'frame.wayRound', rule()), 'shock.wayRound', rule());
  },
  'e-bike': (q, r) =>
    set(
      set(q, 'frame.eBike', r.pick([null, fact(true)])),
      'shock.eBikeApproved',
      r.pick([null, fact(true), fact(false)]),
    ),
  notices: (q, r) =>
    set(q, r.pick(['frame.notices', 'shock.notices']), [
      { id: 'n', title: 'Notice', effect: r.pick(['stop', 'remark']), source: manual },
    ]),
  'reading-conflict': (q, r) => {
    const [eye, stroke] = r.pick([
      [210, 55],
      [210, 50],
      [210, 50],
      [230, 60],
      [190.5, 50.8],
    ] as const);
    const said = set(measured(q, r, eye, stroke), 'rider.confirmsSheetSize', r.chance(0.2));
    return r.chance(0.15) ? set(said, 'present.printedSizeKey', r.pick(['210x50', '190x51'])) : said;
  },
};

const checks = Object.keys(disturb) as CheckId[];

/** A question that fits, perhaps with one thing changed around it, and then one check disturbed and no other. */
export function drawBroken(check: CheckId): (r: Random) => FitQuestion {
  return (r) => disturb[check](r.chance(0.3) ? r.pick(around)(matching, r) : matching, r);
}

/** A matching question with up to two changes around it and up to two disturbances. */
export function drawQuestion(r: Random): FitQuestion {
  let q = matching;
  const changes = r.pick([0, 0, 1, 1, 2]);
  for (let i = 0; i < changes; i += 1) q = r.pick(around)(q, r);
  const times = r.pick([0, 1, 1, 1, 2]);
  for (let i = 0; i < times; i += 1) q = disturb[r.pick(checks)](q, r);
  return q;
}
