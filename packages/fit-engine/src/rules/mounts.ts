import type { AnswerKind, CheckAnswer, Figure } from '../answers.js';
import type { ReasonCode } from '../messages/reason-codes.js';
import { answer, endsOf, figure, rankOf, type Trial, type TrialEnd } from './context.js';
import { known } from './known.js';

interface EndVerdict {
  kind: AnswerKind;
  code: ReasonCode;
  figures: Figure[];
}

/** Both ends against the table of mounts; the worse end decides. */
export function mountsCheck(trial: Trial): CheckAnswer {
  const [a, b] = endsOf(trial).map((end) => judgeEnd(end, trial)) as [EndVerdict, EndVerdict];
  const decides = rankOf(b.kind) > rankOf(a.kind) ? b : a;
  return answer('mounts', decides.kind, decides.code, {
    figures: [...a.figures, ...b.figures],
    ask:
      decides.kind === 'unknown'
        ? [
            ...(a.kind === 'unknown' ? [{ fact: 'entry.frameEnd', whom: 'rider' } as const] : []),
            ...(b.kind === 'unknown' ? [{ fact: 'entry.linkEnd', whom: 'rider' } as const] : []),
          ]
        : [],
  });
}

const verdict = (kind: AnswerKind, code: ReasonCode, figures: Figure[]): EndVerdict => ({
  kind,
  code,
  figures,
});

function judgeEnd({ end, frame, shock }: TrialEnd, trial: Trial): EndVerdict {
  const theirs = figure(`shock.${end}Mount`, shock.kind, null, trial.shock.source);
  if (!frame) return verdict('unknown', 'mounts-not-known', [theirs]);
  const figures = [figure(`frame.${end}Mount`, frame.mount.kind, null, frame.source), theirs];
  const { mount, uncertaintyMm: u } = frame;
  switch (mount.kind) {
    case 'hardware':
      return shock.kind === 'eyelet'
        ? verdict('pass', 'mounts-agree', figures)
        : verdict('fail', 'mounts-need-an-eyelet', figures);
    case 'trunnion':
      return shock.kind === 'trunnion'
        ? verdict('pass', 'mounts-agree', figures)
        : verdict('fail', 'mounts-need-a-trunnion', figures);
    case 'pin': {
      if (shock.kind !== 'eyelet') return verdict('fail', 'mounts-need-an-eyelet', figures);
      const pair = [
        ...figures,
        figure(`frame.${end}Pin`, mount.diameterMm, 'mm', frame.source),
        figure(`shock.${end}Bore`, shock.boreMm, 'mm', trial.shock.source),
      ];
      return lengths([[mount.diameterMm, shock.boreMm]], u, pair, 'mounts-pin-differs');
    }
    case 'bearing-bolt': {
      if (shock.kind !== 'bearing-eye') return verdict('fail', 'mounts-need-a-bearing-eye', figures);
      const pair = [
        ...figures,
        figure(`frame.${end}Bolt`, mount.boltMm, 'mm', frame.source),
        figure(`shock.${end}Bolt`, shock.boltMm, 'mm', trial.shock.source),
        figure(`frame.${end}BearingWidth`, mount.widthMm, 'mm', frame.source),
        figure(`shock.${end}BearingWidth`, shock.widthMm, 'mm', trial.shock.source),
      ];
      return lengths(
        [
          [mount.boltMm, shock.boltMm],
          [mount.widthMm, shock.widthMm],
        ],
        u,
        pair,
        'mounts-bearing-differs',
      );
    }
  }
}

/** Widest doubt in which a rider's reading still says which of the trade's diameters it is, mm. */
const clearEnoughMm = 1.2;

/**
 * Pairs of frame figure and shock figure. Nominals must be equal. A rider's reading agrees within two uncertainties
 * (then confirmed at fitting), differs beyond four, and says nothing certain in between.
 */
function lengths(
  pairs: readonly (readonly [number | null, number])[],
  u: number,
  figures: Figure[],
  differs: ReasonCode,
): EndVerdict {
  const apart = pairs.map(([own, theirs]) => (known(own) && known(theirs) ? Math.abs(own - theirs) : null));
  const [agrees, refuses] = u === 0 ? [0.01, 0.01] : [2 * u, 4 * u];
  if (apart.some((mm) => mm !== null && mm > refuses)) return verdict('fail', differs, figures);
  if (apart.includes(null)) return verdict('unknown', 'mounts-not-measured', figures);
  if (u === 0) return verdict('pass', 'mounts-agree', figures);
  const clear = 2 * u <= clearEnoughMm && apart.every((mm) => mm !== null && mm <= agrees);
  return clear && u > 0
    ? verdict('work', 'mounts-agree-by-your-reading', figures)
    : verdict('unknown', 'mounts-reading-too-coarse', figures);
}
