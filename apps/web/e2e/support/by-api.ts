import type { APIRequestContext } from '@playwright/test';
import { expect } from './stack';

const headers = { 'X-Linkfell-Csrf': '1', 'Sec-Fetch-Site': 'same-origin' };
const answers = {
  frame: { kind: 'listed', frameId: 'ullscar-withen-140', modelYear: 2024, frameSize: null, chip: null },
  'printed-size': { text: '210x50', sizeKey: '210x50' },
  weight: { riderKg: 80, kitKg: 3 },
  'bike-mass': { kg: 14.5 },
  style: { style: 'trail' },
  'remote-wish': { wants: false, acceptsExternal: null },
};

/** What a rider would have done, to the first free slot where a workshop is wanted, on the way to a plan, done by the API with the rider's own session. */
export async function planByApi(
  request: APIRequestContext,
  sizeId: string,
  choices: object = {},
): Promise<{ planId: string; measureUpId: string }> {
  const send = async <T>(method: 'post' | 'put', path: string, data: object, more = {}): Promise<T> => {
    const answer = await request[method](path, { data, headers: { ...headers, ...more } });
    expect(answer.ok(), `${path}: ${answer.status()} ${await answer.text()}`).toBe(true);
    return (await answer.json()) as T;
  };
  const { id: measureUpId } = await send<{ id: string }>('post', '/api/measure-ups', {});
  for (const [question, value] of Object.entries(answers)) {
    await send('put', `/api/measure-ups/${measureUpId}/answers/${question}`, { state: 'known', value });
  }
  const plan = await send<{ id: string; revision: number }>('post', `/api/measure-ups/${measureUpId}/plans`, {
    sizeId,
  });
  const choose = (wanted: object, revision: number) =>
    send<{ revision: number; slots: { start: string }[] }>('put', `/api/plans/${plan.id}/choices`, wanted, {
      'If-Match': `"${revision}"`,
    });
  const { revision, slots } = await choose(choices, plan.revision);
  if ('workshopId' in choices) await choose({ slotStart: slots[0]?.start }, revision);
  return { planId: plan.id, measureUpId };
}
