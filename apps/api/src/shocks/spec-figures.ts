import type { ShockPage, SpecFigure } from '@linkfell/contracts';
import { kPaPerPsi, sizeOf, type ShockFacts, type ShockMount, type Source } from '@linkfell/fit-engine';

const notStated = 'not stated';
const number = (value: number, decimals = 1): string => String(Number(value.toFixed(decimals)));

const row = (
  label: string,
  value: string,
  unit: string | null = null,
  source: Source | null = null,
): SpecFigure => ({ label, value, unit: value === notStated ? null : unit, source });

/** One end of a shock in a few words, such as "eyelet, bore 15 mm". */
export function shockEndWords(mount: ShockMount): string {
  switch (mount.kind) {
    case 'eyelet':
      return `eyelet, bore ${number(mount.boreMm)} mm`;
    case 'bearing-eye':
      return `bearing eye, ${number(mount.widthMm)} mm wide, ${number(mount.boltMm)} mm bolt`;
    case 'trunnion':
      return 'trunnion';
  }
}

const span = (from: number | null, to: number | null, per: number, decimals: number): string => {
  if (from === null && to === null) return notStated;
  const end = (kPa: number | null) => (kPa === null ? '?' : number(kPa / per, decimals));
  return `${end(from)} to ${end(to)}`;
};

function springFigures({ spring }: ShockFacts): SpecFigure[] {
  if (spring.kind === 'air') {
    return [
      row('Spring', 'air'),
      row('Pressure, least to most', span(spring.minGaugeKPa, spring.maxGaugeKPa, kPaPerPsi, 0), 'psi'),
      row('the same in bar', span(spring.minGaugeKPa, spring.maxGaugeKPa, 100, 1), 'bar'),
    ];
  }
  return [
    row('Spring', 'coil, bought by its rate'),
    row('Inside diameter of springs', number(spring.springInsideMm), 'mm'),
    row('Longest spring', number(spring.maxFreeLengthMm), 'mm'),
    row('Collar, a turn', spring.collarPitchMm === null ? notStated : number(spring.collarPitchMm, 2), 'mm'),
  ];
}

const limitBases = {
  rider: 'of the rider',
  'rider-and-kit': 'of rider and kit',
  'with-bike': 'of rider, kit and bike',
} as const;

function limitFigures({ riderLimit, eBikeApproved, serviceHours }: ShockFacts): SpecFigure[] {
  const basis = riderLimit?.value.basis;
  return [
    riderLimit
      ? row(
          `Most weight${basis ? ` ${limitBases[basis]}` : ''}`,
          number(riderLimit.value.kg),
          'kg',
          riderLimit.source,
        )
      : row('Most weight', notStated),
    row(
      'E-bikes',
      eBikeApproved === null ? notStated : eBikeApproved.value ? 'allowed' : 'refused',
      null,
      eBikeApproved?.source ?? null,
    ),
    row('Service every', serviceHours === null ? notStated : number(serviceHours), 'hours'),
  ];
}

const wayRoundWords = {
  'body-to-frame': 'body towards the frame',
  'body-to-link': 'body towards the link',
} as const;

function shapeFigures(shock: ShockFacts): SpecFigure[] {
  const { spring, diameterMm, reservoir, remote, wayRound, massG } = shock;
  return [
    row(spring.kind === 'air' ? 'Can, diameter' : 'Over the coil, diameter', number(diameterMm), 'mm'),
    ...(reservoir
      ? [
          row('Reservoir, diameter', number(reservoir.diameterMm), 'mm'),
          row('Reservoir, length', number(reservoir.lengthMm), 'mm'),
          row('Reservoir can be turned to', reservoir.positionsDeg.map((deg) => `${deg}°`).join(', ')),
        ]
      : [row('Reservoir', 'none, inline')]),
    row(
      'Lever',
      remote ? `remote, ${remote.action.replaceAll('-', ' ')}, ${remote.line}` : 'by hand, on the shock',
    ),
    row(
      'Way round',
      wayRound ? wayRoundWords[wayRound.value] : 'either',
      null,
      wayRound ? wayRound.source : null,
    ),
    row(spring.kind === 'air' ? 'Mass' : 'Mass without spring', number(massG, 0), 'g'),
  ];
}

/** A shock's data sheet for people: every figure with its unit, "not stated" where its maker says nothing. */
export function specGroups(shock: ShockFacts): ShockPage['groups'] {
  const size = sizeOf(shock.sizeKey);
  return [
    {
      title: 'Size and mounts',
      figures: [
        row('Eye-to-eye', size ? number(size.eyeToEyeMm, 2) : (shock.sizeKey.split('x')[0] ?? ''), 'mm'),
        row('Stroke', size ? number(size.strokeMm, 2) : (shock.sizeKey.split('x')[1] ?? ''), 'mm'),
        ...(shock.spacedToKeys.length > 0
          ? [
              row(
                'Stroke with travel spacers',
                shock.spacedToKeys.map((key) => key.split('x')[1]).join(', '),
                'mm',
              ),
            ]
          : []),
        row('Body end', shockEndWords(shock.bodyEnd)),
        row('Shaft end', shockEndWords(shock.shaftEnd)),
      ],
    },
    { title: 'Shape and mass', figures: shapeFigures(shock) },
    {
      title: 'Spring and damping',
      figures: [...springFigures(shock), row('Tune', shock.tune ?? notStated)],
    },
    { title: 'Limits and care', figures: limitFigures(shock) },
  ];
}

/** What is needed to fit and use it, and is sold apart. */
export function notInTheBox({ bodyEnd, shaftEnd, spring, remote }: ShockFacts): string[] {
  const eyelets = [bodyEnd, shaftEnd].filter(({ kind }) => kind === 'eyelet').length;
  return [
    ...(eyelets === 2 ? ['Mounting hardware for its two eyelets'] : []),
    ...(eyelets === 1 ? ['Mounting hardware for its one eyelet'] : []),
    ...(spring.kind === 'coil' ? ['The coil spring, chosen for your weight'] : ['A shock pump']),
    ...(remote ? [`The lever at the bar and its ${remote.line} line`] : []),
  ];
}
