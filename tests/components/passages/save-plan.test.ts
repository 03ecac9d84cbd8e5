import { describe, expect, it } from 'vitest';
import { savePlan } from '@/components/passages/save-plan';
import { buildPlan } from '../../builders/check-result';

const answer = (status: number, body: unknown) =>
  (async () => Response.json(body, { status })) as unknown as typeof fetch;
const save = (send: typeof fetch) => savePlan('id', buildPlan(), 3, send);

describe('savePlan', () => {
  it('gives the new revision', async () => {
    expect(await save(answer(200, { revision: 4, check: {} }))).toEqual({ kind: 'saved', revision: 4 });
  });

  it('maps problem details to the plan’s own fields', async () => {
    const outcome = await save(
      answer(422, { detail: 'd', errors: [{ pointer: '/plan/wind/rows/0/gustKn', detail: 'low' }] }),
    );
    expect(outcome).toMatchObject({ kind: 'fields', problems: new Map([['/wind/rows/0/gustKn', 'low']]) });
  });

  it('tells a conflict, a lost session and a fault apart', async () => {
    expect(await save(answer(409, { detail: 'meanwhile' }))).toEqual({ kind: 'conflict', detail: 'meanwhile' });
    expect(await save(answer(401, {}))).toEqual({ kind: 'signed-out' });
    expect(await save(answer(500, { detail: 'number 7' }))).toEqual({ kind: 'failed', detail: 'number 7' });
    expect(await save(async () => Promise.reject(new TypeError('offline')))).toMatchObject({ kind: 'failed' });
    expect(await save(async () => new Response('<html>', { status: 200 }))).toMatchObject({ kind: 'failed' });
  });
});
