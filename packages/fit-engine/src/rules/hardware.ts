import type { AskNeed, CheckAnswer, PartNeed, WorkNeed } from '../answers.js';
import { endHardware, type EndHardware } from '../hardware/end-hardware.js';
import type { ReasonCode } from '../messages/reason-codes.js';
import { answer, endsOf, figure, type Trial } from './context.js';

/** What each end needs between frame and eyelet. Press work is for the workshop only. */
export function hardwareCheck(trial: Trial): CheckAnswer {
  const { present, sale } = trial;
  const ends = endsOf(trial).map(({ end, frame, shock }) => ({
    end,
    frame,
    found: endHardware(
      frame,
      shock,
      end === 'frame' ? present.frameEndHardware : present.linkEndHardware,
      sale.kits,
    ),
  }));
  const figures = ends.flatMap(({ end, frame }) =>
    frame?.mount.kind === 'hardware' && frame.mount.widthMm !== null && frame.mount.boltMm !== null
      ? [figure(`frame.${end}Hardware`, `${frame.mount.widthMm}x${frame.mount.boltMm}`, 'mm', frame.source)]
      : [],
  );
  const open = ends.filter(({ found }) => openCode(found) !== null);
  const [first] = open;
  if (first) {
    const ask = open.map(({ end, found }): AskNeed => ({
      fact:
        found.kind === 'none-on-sale' ? 'sale.kits' : end === 'frame' ? 'entry.frameEnd' : 'entry.linkEnd',
      whom: found.kind === 'none-on-sale' ? 'workshop' : 'rider',
    }));
    return answer('hardware', 'unknown', openCode(first.found) ?? 'hardware-not-measured', { figures, ask });
  }
  const parts: PartNeed[] = [];
  const work: WorkNeed[] = [];
  for (const { end, found } of ends) {
    if (found.kind === 'reuse') work.push({ id: 'press-in-reuse', end, workshopOnly: true });
    if (found.kind === 'kit') {
      const { id, name } = found.kit;
      parts.push({
        kind: 'kit',
        partId: id,
        name,
        end,
        quantity: 1,
        confirmAtFitting: found.confirmAtFitting,
      });
      work.push({ id: 'press-in-kit', end, workshopOnly: true });
    }
  }
  if (work.length === 0) return answer('hardware', 'pass', 'hardware-none-needed', { figures });
  const code: ReasonCode = parts.length > 0 ? 'hardware-kit' : 'hardware-reuse';
  return answer('hardware', 'work', code, { figures, parts, work });
}

function openCode(found: EndHardware): ReasonCode | null {
  switch (found.kind) {
    case 'several':
      return 'hardware-several-kits';
    case 'none-on-sale':
      return 'hardware-none-on-sale';
    case 'not-measured':
      return 'hardware-not-measured';
    case 'nothing':
    case 'reuse':
    case 'kit':
      return null;
  }
}
