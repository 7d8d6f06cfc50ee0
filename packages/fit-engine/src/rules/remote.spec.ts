import { describe, expect, it } from 'vitest';

import {
  aFrame,
  aPresentShock,
  aQuestion,
  aRider,
  aShock,
  fact,
  someParts,
} from '../../test/judging/questions.js';
import type { CheckId } from '../answers.js';
import type { FitQuestion, RiderFacts } from '../facts.js';
import { judge } from '../judge.js';

const codeOf = (check: CheckId, over: Partial<FitQuestion>): string | undefined =>
  judge(aQuestion(over), { full: true }).answers.find((given) => given.check === check)?.code;

describe('remote', () => {
  const lock = { action: 'pull-to-lock', line: 'cable', holdOpenPartId: null } as const;
  const open = { action: 'pull-to-open', line: 'cable', holdOpenPartId: 'clip' } as const;
  const ask = (
    remote: FitQuestion['shock']['remote'],
    rider: Partial<RiderFacts>,
    more: Partial<FitQuestion> = {},
  ) => codeOf('remote', { shock: aShock({ remote }), rider: aRider(rider), ...more });
  const none = { frame: aFrame({ cableRouting: fact('none') }) };

  it('wanted and not there does not do what was asked', () => {
    expect(ask(null, { wantsRemote: true })).toBe('remote-wanted-has-none');
    expect(ask(null, { wantsRemote: false })).toBe('remote-none');
  });

  it.each([null, lock, open])('not answered is asked for', (remote) => {
    expect(ask(remote, { wantsRemote: null })).toBe('remote-wish-not-known');
  });

  it('without routing waits for the rider to accept external', () => {
    expect(ask(lock, { wantsRemote: true }, none)).toBe('remote-no-routing');
    const own = aPresentShock({ remoteAction: 'pull-to-lock', remoteLine: 'cable' });
    const accepted = { wantsRemote: true, acceptsExternalRouting: true };
    expect(ask(lock, accepted, { ...none, present: own })).toBe('remote-external-routing');
    expect(ask(lock, { wantsRemote: true }, { frame: aFrame({ cableRouting: null }) })).toBe(
      'remote-routing-not-known',
    );
  });

  it('adds a lever where the rider’s own disagrees or is not known', () => {
    for (const present of [
      aPresentShock(),
      aPresentShock({ remoteAction: 'pull-to-open', remoteLine: 'cable' }),
    ]) {
      expect(ask(lock, { wantsRemote: true }, { present })).toBe('remote-lever-added');
    }
    expect(ask(lock, { wantsRemote: true }, { sale: someParts({ remotes: [] }) })).toBe(
      'remote-no-lever-on-sale',
    );
  });

  it('not wanted stays open when pulled to lock, and needs a part when pulled to open', () => {
    expect(ask(lock, { wantsRemote: false })).toBe('remote-stays-open');
    expect(ask(open, { wantsRemote: false })).toBe('remote-stays-closed');
    expect(ask(open, { wantsRemote: false }, { sale: someParts({ otherPartIds: ['clip'] }) })).toBe(
      'remote-held-open',
    );
  });
});
