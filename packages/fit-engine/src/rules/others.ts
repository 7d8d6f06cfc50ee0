import type { CheckAnswer } from '../answers.js';
import { contradictsSheet, listedFor } from './contradicts-sheet.js';
import { answer, figure, riderSaid, type Trial } from './context.js';

/** Makers' rules on which end goes where. */
export function positionCheck({ frame, shock, wayRound }: Trial): CheckAnswer {
  const rules = [
    frame.wayRound && figure('frame.wayRound', frame.wayRound.value, null, frame.wayRound.source),
    shock.wayRound && figure('shock.wayRound', shock.wayRound.value, null, shock.wayRound.source),
  ].filter((rule) => rule !== null);
  if (rules.length === 0) return answer('position', 'pass', 'position-free');
  return rules.every((rule) => rule.value === wayRound)
    ? answer('position', 'pass', 'position-as-ruled', { figures: rules, remark: true })
    : answer('position', 'fail', 'position-against-rule', { figures: rules });
}

/** An e-bike needs a shock that its maker allows there. */
export function eBikeCheck({ frame, shock }: Trial): CheckAnswer {
  const bike = frame.eBike;
  const word = shock.eBikeApproved;
  if (bike?.value === false) return answer('e-bike', 'pass', 'e-bike-not-one');
  const figures = word ? [figure('shock.eBike', word.value ? 'yes' : 'no', null, word.source)] : [];
  if (word?.value === true) return answer('e-bike', 'pass', 'e-bike-approved', { figures });
  if (!bike) {
    return answer('e-bike', 'unknown', 'e-bike-not-told', {
      figures,
      ask: [{ fact: 'frame.eBike', whom: 'rider' }],
    });
  }
  return word
    ? answer('e-bike', 'fail', 'e-bike-refused', { figures })
    : answer('e-bike', 'unknown', 'e-bike-no-word', {
        ask: [{ fact: 'shock.eBikeApproved', whom: 'shock-maker' }],
      });
}

/** A maker's recall stops the sale; other notices are shown. */
export function noticesCheck({ frame, shock }: Trial): CheckAnswer {
  // A recall first: the sentence names the first.
  const notices = [...frame.notices, ...shock.notices].sort(
    (a, b) => Number(b.effect === 'stop') - Number(a.effect === 'stop') || (a.id < b.id ? -1 : 1),
  );
  const figures = notices.map((notice) => figure('notice', notice.title, null, notice.source));
  if (notices.some((notice) => notice.effect === 'stop'))
    return answer('notices', 'fail', 'notices-stop', { figures });
  return notices.length > 0
    ? answer('notices', 'pass', 'notices-remark', { figures, remark: true })
    : answer('notices', 'pass', 'notices-none');
}

/**
 * A settled reading that the sheet does not list for this bike (year, size, chip position) stands against every match until
 * somebody says which is right.
 */
export function readingConflictCheck({ frame, rider, shared }: Trial): CheckAnswer {
  const { size } = shared;
  if (!contradictsSheet(frame, rider, size)) return answer('reading-conflict', 'pass', 'reading-no-conflict');
  const listed = listedFor(frame, rider);
  const figures = [
    figure('present.size', size.sizeKey, null, riderSaid),
    figure('frame.size', [...new Set(listed)].join(', '), null, frame.entries[0]?.source ?? riderSaid),
  ];
  return rider.confirmsSheetSize
    ? answer('reading-conflict', 'pass', 'reading-conflict-confirmed', { figures, remark: true })
    : answer('reading-conflict', 'unknown', 'reading-conflict', {
        figures,
        ask: [{ fact: 'rider.confirmsSheetSize', whom: 'rider' }],
      });
}
