import type { AskNeed, CheckAnswer, PartNeed, WorkNeed } from '../answers.js';
import { answer, figure, type Trial } from './context.js';

const ask = (fact: string, whom: AskNeed['whom'] = 'rider'): readonly AskNeed[] => [{ fact, whom }];

/** Whether the shock can be worked from the bar as the rider wants, and what that takes. */
export function remoteCheck(trial: Trial): CheckAnswer {
  const { rider } = trial;
  // Not answered is not "no": a shock that suits either wish would still need its lever priced, or not.
  if (rider.wantsRemote === null) {
    return answer('remote', 'unknown', 'remote-wish-not-known', { ask: ask('rider.wantsRemote') });
  }
  return rider.wantsRemote ? wanted(trial) : notWanted(trial);
}

function wanted({ rider, shock, frame, present, sale }: Trial): CheckAnswer {
  const { remote } = shock;
  if (!remote) return answer('remote', 'fail', 'remote-wanted-has-none');
  const routing = frame.cableRouting;
  const figures = [
    routing && figure('frame.routing', routing.value, null, routing.source),
    figure('shock.remote', remote.action, null, shock.source),
  ];
  const work: WorkNeed[] = [];
  const parts: PartNeed[] = [];
  // Outside the frame there is always a way, known routing or not, once the rider accepts it.
  if (!routing && rider.acceptsExternalRouting !== true) {
    return answer('remote', 'unknown', 'remote-routing-not-known', {
      figures,
      ask: [...ask('frame.cableRouting'), ...ask('rider.acceptsExternalRouting')],
    });
  }
  if (!routing || routing.value === 'none') {
    if (rider.acceptsExternalRouting !== true) {
      return answer('remote', 'unknown', 'remote-no-routing', {
        figures,
        ask: ask('rider.acceptsExternalRouting'),
      });
    }
    work.push({ id: 'route-external', end: null, workshopOnly: false });
  }
  const own = present.remoteAction === remote.action && present.remoteLine === remote.line;
  if (!own) {
    const [lever] = sale.remotes
      .filter(({ action, line }) => action === remote.action && line === remote.line)
      .sort((a, b) => (a.id < b.id ? -1 : 1));
    if (!lever)
      return answer('remote', 'unknown', 'remote-no-lever-on-sale', {
        figures,
        ask: ask('sale.remotes', 'workshop'),
      });
    parts.push({
      kind: 'remote',
      partId: lever.id,
      name: lever.name,
      end: null,
      quantity: 1,
      confirmAtFitting: false,
    });
    work.push({ id: 'fit-remote', end: null, workshopOnly: false });
  }
  if (work.length === 0) return answer('remote', 'pass', 'remote-your-lever-agrees', { figures });
  return answer('remote', 'work', own ? 'remote-external-routing' : 'remote-lever-added', {
    figures,
    parts,
    work,
  });
}

function notWanted({ shock, sale }: Trial): CheckAnswer {
  const { remote } = shock;
  if (!remote) return answer('remote', 'pass', 'remote-none');
  const figures = [figure('shock.remote', remote.action, null, shock.source)];
  if (remote.action === 'pull-to-lock') {
    return answer('remote', 'pass', 'remote-stays-open', { figures, remark: true });
  }
  const part = remote.holdOpenPartId;
  if (part === null || !sale.otherPartIds.includes(part)) {
    return answer('remote', 'fail', 'remote-stays-closed', { figures });
  }
  return answer('remote', 'work', 'remote-held-open', {
    figures,
    parts: [{ kind: 'hold-open', partId: part, name: part, end: null, quantity: 1, confirmAtFitting: false }],
    work: [{ id: 'hold-open-part', end: null, workshopOnly: false }],
  });
}
