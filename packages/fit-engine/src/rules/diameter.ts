import type { CheckAnswer } from '../answers.js';
import { lateralOk } from '../clearance/lateral.js';
import { answer, figure, riderSaid, type Trial } from './context.js';
import { known, positive } from './known.js';

/** Can or coil across the frame's tunnel, 2 mm free on each side. */
export function diameterCheck({ frame, shock, present }: Trial): CheckAnswer {
  const theirs = figure('shock.diameter', shock.diameterMm, 'mm', shock.source);
  const tunnel = frame.tunnelWidthMm;
  if (tunnel && known(tunnel.value) && positive(shock.diameterMm)) {
    const figures = [figure('frame.tunnel', tunnel.value, 'mm', tunnel.source), theirs];
    return lateralOk(shock.diameterMm, tunnel.value)
      ? answer('diameter', 'pass', 'diameter-fits', { figures })
      : answer('diameter', 'fail', 'diameter-too-wide', { figures });
  }
  const noWider =
    known(present.diameterMm) &&
    positive(shock.diameterMm) &&
    present.spring === shock.spring.kind &&
    present.bodyEndKind === shock.bodyEnd.kind &&
    shock.diameterMm <= present.diameterMm;
  if (noWider) {
    return answer('diameter', 'pass', 'diameter-no-wider-than-yours', {
      figures: [figure('present.diameter', present.diameterMm, 'mm', riderSaid), theirs],
    });
  }
  return answer('diameter', 'unknown', 'diameter-tunnel-not-known', {
    figures: [theirs],
    ask: [
      { fact: 'frame.tunnelWidthMm', whom: 'rider' },
      { fact: 'frame.tunnelWidthMm', whom: 'frame-maker' },
    ],
  });
}
