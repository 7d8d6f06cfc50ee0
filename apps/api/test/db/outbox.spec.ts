import { setTimeout as sleep } from 'node:timers/promises';

import { backoffMs, maxAttempts } from '../../src/outbox/backoff.js';
import { GiveUp, type OutboxDelivery } from '../../src/outbox/outbox-handler.js';
import { OutboxMessage } from '../../src/outbox/outbox-message.entity.js';
import { OutboxRegistry } from '../../src/outbox/outbox-registry.js';
import { OutboxRunner } from '../../src/outbox/outbox-runner.js';
import { OutboxWorker } from '../../src/outbox/outbox-worker.js';
import { OutboxService } from '../../src/outbox/outbox.service.js';
import { startTestApp, type TestApp } from '../support/app.js';

interface Seen extends OutboxDelivery {
  payload: unknown;
}

describe('outbox', () => {
  let app: TestApp;
  let outbox: OutboxService;
  let runner: OutboxRunner;
  let seen: Seen[];
  let behave: (delivery: OutboxDelivery) => Promise<void>;

  beforeAll(async () => {
    app = await startTestApp();
    outbox = app.nest.get(OutboxService);
    runner = app.nest.get(OutboxRunner);
    app.nest.get(OutboxRegistry).register('test', async (payload, delivery) => {
      seen.push({ ...delivery, payload });
      await behave(delivery);
    });
  });
  beforeEach(async () => {
    seen = [];
    behave = () => Promise.resolve();
    await app.manager.clear(OutboxMessage, { cascade: true });
  });
  afterAll(() => app.close());

  const add = async (payload: object, options = {}): Promise<string> => {
    const id = await app.dataSource.transaction((manager) => outbox.add(manager, 'test', payload, options));
    if (id === null) throw new Error('not added');
    return id;
  };
  const row = (id: string) => app.manager.findOneByOrFail(OutboxMessage, { id });

  it('delivers once, in the order in which messages were added', async () => {
    await app.dataSource.transaction(async (manager) => {
      for (const n of [1, 2, 3, 4, 5]) await outbox.add(manager, 'test', { n });
    });
    expect(await app.drainOutbox()).toBe(5);
    expect(seen.map(({ payload }) => payload)).toEqual([{ n: 1 }, { n: 2 }, { n: 3 }, { n: 4 }, { n: 5 }]);
    expect(await app.drainOutbox()).toBe(0);
    expect(await app.manager.countBy(OutboxMessage, { state: 'done' })).toBe(5);
  });

  it('keeps nothing of a transaction that was rolled back, queue entry included', async () => {
    const jobs = () => app.dataSource.query('SELECT count(*)::int AS n FROM graphile_worker.jobs');
    const before = await jobs();
    await expect(
      app.dataSource.transaction(async (manager) => {
        await outbox.add(manager, 'test', {});
        throw new Error('changed our mind');
      }),
    ).rejects.toThrow('changed our mind');
    expect(await app.drainOutbox()).toBe(0);
    expect(await jobs()).toEqual(before);
  });

  it('writes one message per dedupe key', async () => {
    await add({ n: 1 }, { dedupeKey: 'only once' });
    const second = await app.dataSource.transaction((manager) =>
      outbox.add(manager, 'test', { n: 2 }, { dedupeKey: 'only once' }),
    );
    expect(second).toBeNull();
    await app.drainOutbox();
    expect(seen.map(({ payload }) => payload)).toEqual([{ n: 1 }]);
  });

  it('waits for the time asked for', async () => {
    await add({}, { runAt: new Date(app.clock.now().getTime() + 31 * 60_000) });
    app.clock.advance({ minutes: 30 });
    expect(await app.drainOutbox()).toBe(0);
    app.clock.advance({ minutes: 1 });
    expect(await app.drainOutbox()).toBe(1);
  });

  it('tries again later and later, under the same id, and then stops', async () => {
    behave = () => Promise.reject(new Error('mail server said no to wren@example.test'));
    const id = await add({});
    await app.drainOutbox();
    const first = await row(id);
    expect(first).toMatchObject({ state: 'pending', attempts: 1, leaseUntil: null });
    expect(first.lastError).toBe('mail server said no to w…@example.test');
    expect(first.nextTryAt.getTime() - app.clock.now().getTime()).toBeGreaterThanOrEqual(8_000);
    for (let attempt = 2; attempt <= maxAttempts; attempt += 1) {
      expect(await app.drainOutbox()).toBe(0);
      app.clock.advance({ hours: 1 });
      expect(await app.drainOutbox()).toBe(1);
    }
    expect(await row(id)).toMatchObject({ state: 'dead', attempts: maxAttempts });
    app.clock.advance({ days: 1 });
    expect(await app.drainOutbox()).toBe(0);
    expect(new Set(seen.map((delivery) => delivery.id))).toEqual(new Set([id]));
  });

  it('gives up at once when trying again can never help', async () => {
    behave = () => Promise.reject(new GiveUp('no such address'));
    const id = await add({});
    await app.drainOutbox();
    expect(await row(id)).toMatchObject({ state: 'dead', attempts: 1 });
  });

  it('keeps a message of an unknown topic for a release that knows it', async () => {
    const id = await app.dataSource.transaction((manager) => outbox.add(manager, 'from the future', {}));
    await app.drainOutbox();
    expect(await row(id ?? '')).toMatchObject({ state: 'pending', attempts: 1 });
  });

  it('takes over from a process that died with the message in hand, after the lease', async () => {
    const id = await add({});
    let die: () => void = () => undefined;
    behave = ({ attempt }) => (attempt === 1 ? new Promise((resolve) => (die = resolve)) : Promise.resolve());
    const lost = runner.run(id);
    while (seen.length === 0) await sleep(5);
    app.clock.advance({ minutes: 1 });
    expect(await app.drainOutbox()).toBe(0);
    app.clock.advance({ minutes: 1 });
    expect(await app.drainOutbox()).toBe(1);
    expect(await row(id)).toMatchObject({ state: 'done', attempts: 2 });
    // The first holder comes back from the dead: it changes nothing.
    const before = await row(id);
    die();
    await lost;
    expect(await row(id)).toEqual(before);
  });

  it('is delivered once when many take it at the same moment', async () => {
    const id = await add({});
    behave = () => sleep(20);
    const outcomes = await Promise.all(Array.from({ length: 8 }, () => runner.run(id)));
    expect(outcomes.filter((outcome) => outcome === 'done')).toHaveLength(1);
    expect(outcomes.filter((outcome) => outcome === 'not-due')).toHaveLength(7);
    expect(seen).toHaveLength(1);
  });

  it('is woken by the queue as soon as the transaction is committed', async () => {
    const worker = app.nest.get(OutboxWorker);
    // The queue lives in real time.
    app.clock.set(new Date().toISOString());
    await worker.start();
    try {
      const id = await add({ through: 'queue' });
      for (let wait = 0; wait < 200 && (await row(id)).state !== 'done'; wait += 1) await sleep(25);
      expect(await row(id)).toMatchObject({ state: 'done', attempts: 1 });
      expect(seen.map(({ payload }) => payload)).toEqual([{ through: 'queue' }]);
    } finally {
      await worker.beforeApplicationShutdown();
    }
  });
});

describe('backoffMs', () => {
  it('doubles from ten seconds to an hour and varies by a fifth', () => {
    expect([1, 2, 3, 9, 10, 12].map((attempt) => backoffMs(attempt, 0))).toEqual([
      10_000, 20_000, 40_000, 2_560_000, 3_600_000, 3_600_000,
    ]);
    expect(backoffMs(1, 0.999)).toBeGreaterThanOrEqual(8_000);
  });
});
