// A catalogue drawn by a seed: many makers, each with its own figures, spread over the sizes of the trade.

/** mulberry32, so that every run measures the same catalogue. */
export function seeded(seed) {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
  const between = (from, to) => from + next() * (to - from);
  return {
    chance: (p) => next() < p,
    pick: (list) => list[Math.floor(next() * list.length)],
    between,
    rounded: (from, to, step) => Math.round(between(from, to) / step) * step,
  };
}

const tables = {
  eyelet: {
    190: [37.5, 40, 42.5, 45],
    210: [47.5, 50, 52.5, 55],
    230: [57.5, 60, 62.5, 65],
    250: [67.5, 70, 72.5, 75],
  },
  trunnion: {
    165: [37.5, 40, 42.5, 45],
    185: [47.5, 50, 52.5, 55],
    205: [57.5, 60, 62.5, 65],
    225: [67.5, 70, 72.5, 75],
  },
};
const keysOf = (family) =>
  Object.entries(tables[family]).flatMap(([eye, strokes]) => strokes.map((stroke) => `${eye}x${stroke}`));
const keys = {
  eyelet: keysOf('eyelet'),
  trunnion: keysOf('trunnion'),
  inch: [
    '165x38',
    '184x44',
    '190x50',
    '197x48',
    '200x50',
    '200x57',
    '216x63',
    '222x66',
    '222x70',
    '240x76',
    '267x89',
  ],
};

/** What all sizes and versions of one model share. */
function drawModel(r, number) {
  const family = r.pick(['eyelet', 'eyelet', 'eyelet', 'trunnion', 'trunnion', 'inch']);
  const coil = r.chance(0.25);
  const source = {
    kind: 'maker',
    label: `Maker ${number % 24} specification sheet ${number}`,
    date: '2026-03-01',
  };
  const said = (value) => ({ value, source });
  const eye = () =>
    r.chance(0.12)
      ? { kind: 'bearing-eye', boltMm: r.pick([8, 10]), widthMm: r.pick([30, 54.9]) }
      : { kind: 'eyelet', boreMm: r.chance(0.85) ? 15 : 12.7 };
  return {
    number,
    family,
    source,
    said,
    bodyEnd: family === 'trunnion' ? { kind: 'trunnion' } : eye(),
    shaftEnd: eye(),
    coil: coil && { springInsideMm: r.pick([36, 36, 38]), collarPitchMm: r.pick([null, 1, 1.5]) },
    piston: r.rounded(36, 46, 0.5),
    limits: [r.rounded(300, 700, 50), r.chance(0.95) ? r.rounded(1700, 2500, 50) : null],
    drawn: r.chance(0.6),
    diameterMm: coil ? r.rounded(58, 68, 0.5) : r.rounded(44, 58, 0.5),
    can: r.chance(0.45) && {
      lengthMm: r.rounded(70, 110, 1),
      diameterMm: r.rounded(36, 44, 0.5),
      lift: r.rounded(58, 78, 0.5),
    },
    spaced: r.chance(0.3),
    eBikeApproved: r.chance(0.25) ? null : said(r.chance(0.8)),
    riderLimit: r.chance(0.35)
      ? said({ kg: r.pick([100, 110, 113, 120, 130]), basis: r.pick(['rider', 'rider-and-kit', null]) })
      : null,
    wayRound: r.chance(0.2) ? said(r.pick(['body-to-frame', 'body-to-link'])) : null,
    notices: r.chance(0.02)
      ? [{ id: `n${number}`, title: 'Check the eye bolt', effect: r.pick(['stop', 'remark']), source }]
      : [],
    holdOpenPartId: r.pick([null, 'clip']),
    serviceHours: r.pick([null, 50, 100, 200]),
  };
}

/** A can beside the body, nine corners, above or below the shock's axis. */
const outline = (eyeToEyeMm, half, { lift, lengthMm }, up) => {
  const end = 0.62 * eyeToEyeMm;
  const points = [
    [-14, -14],
    [28, -half],
    [end, -half],
    [end, half],
    [24 + lengthMm, half],
    [24 + lengthMm, lift],
    [20, lift],
    [20, half],
    [-14, 14],
  ];
  return up ? points : points.map(([x, y]) => [x, -y]).reverse();
};

function drawSpring(r, model, strokeMm) {
  const { coil, piston, limits, drawn, said } = model;
  if (coil) return { kind: 'coil', ...coil, maxFreeLengthMm: Math.round(strokeMm * 1.9 + 32) };
  const areaMm2 = Math.round((Math.PI / 4) * piston ** 2);
  const chambers = {
    areaMm2,
    negativeAreaMm2: Math.round(areaMm2 * 0.85),
    volumeMm3: Math.round(areaMm2 * strokeMm * r.between(1.45, 1.8)),
    negativeVolumeMm3: Math.round(areaMm2 * r.between(12, 18)),
  };
  return {
    kind: 'air',
    minGaugeKPa: limits[0],
    maxGaugeKPa: limits[1],
    chambers: drawn ? said(chambers) : null,
  };
}

function drawSize(r, model, sizeKey, version) {
  const { can, diameterMm, said } = model;
  const [eye, stroke] = sizeKey.split('x').map(Number);
  const shorter = (tables[model.family]?.[eye] ?? []).filter((other) => other < stroke);
  return {
    sizeId: `m${model.number}-${sizeKey}-${version}`,
    modelName: `Model ${model.number} ${version}`,
    makerName: `Maker ${model.number % 24}`,
    sizeKey,
    spacedToKeys: model.spaced ? shorter.map((other) => `${eye}x${other}`) : [],
    bodyEnd: model.bodyEnd,
    shaftEnd: model.shaftEnd,
    spring: drawSpring(r, model, stroke),
    diameterMm,
    reservoir: can
      ? {
          lengthMm: can.lengthMm,
          diameterMm: can.diameterMm,
          positionsDeg: [0, 180],
          outlines: [true, false].map((up) => ({
            positionDeg: up ? 0 : 180,
            polygon: outline(eye, diameterMm / 2, can, up),
          })),
        }
      : null,
    remote:
      version % 3 === 2
        ? {
            action: r.pick(['pull-to-lock', 'pull-to-lock', 'pull-to-open']),
            line: r.pick(['cable', 'hydraulic']),
            holdOpenPartId: model.holdOpenPartId,
          }
        : null,
    eBikeApproved: model.eBikeApproved && said(model.eBikeApproved.value),
    riderLimit: model.riderLimit && said({ ...model.riderLimit.value }),
    wayRound: model.wayRound,
    tune: r.pick(['low', 'middle', 'high']),
    massG: r.rounded(340, 980, 1),
    serviceHours: model.serviceHours,
    notices: model.notices,
    source: model.source,
  };
}

/** So many shocks, no two with the same facts. */
export function drawCatalogue(count, seed) {
  const r = seeded(seed);
  const shocks = [];
  for (let number = 0; shocks.length < count; number += 1) {
    const model = drawModel(r, number);
    for (const key of keys[model.family]) {
      for (let version = 0; version < 3; version += 1) {
        if (r.chance(0.6)) shocks.push(drawSize(r, model, key, version));
      }
    }
  }
  shocks.length = count;
  const facts = (shock) => JSON.stringify({ ...shock, sizeId: '', modelName: '' });
  if (new Set(shocks.map(facts)).size !== count) throw new Error('two sizes of the catalogue are the same');
  return shocks;
}
