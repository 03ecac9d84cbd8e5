import { describe, expect, it } from 'vitest';
import { draftFromPlan } from '@/components/passages/draft-from-plan';
import { emptyDraft, type PlanDraft } from '@/components/passages/plan-draft';
import { readPlan } from '@/components/passages/plan-from-draft';
import { buildPlan } from '../../builders/check-result';

const stream = [{ time: '2026-06-01T15:00:00.000Z', towardDeg: 350, kn: 1.5 }];
const draftOf = (change: Partial<PlanDraft> = {}): PlanDraft => ({ ...draftFromPlan(buildPlan(), 'UTC'), ...change });

describe('readPlan', () => {
  it('reads back the very plan that was written', () => {
    const plan = buildPlan({ streamRows: stream, limits: { gustKn: 25, afterDark: false } });
    expect(readPlan(draftFromPlan(plan, 'UTC')).plan).toEqual(plan);
  });

  it('puts each message at its field', () => {
    const draft = draftOf();
    const { plan, problems } = readPlan({
      ...draft,
      departure: { text: '2026-03-08 02:30', which: '' },
      waypoints: draft.waypoints.map((one, i) => (i === 1 ? { ...one, lat: '97', corridor: '5' } : one)),
      windRows: draft.windRows.map((one, i) => (i === 0 ? { ...one, mean: '300', gust: '' } : one)),
    });
    expect(plan).toBeNull();
    expect([...problems.keys()].sort()).toEqual([
      '/departure',
      '/route/1/corridorHalfWidthM',
      '/route/1/lat',
      '/wind/rows/0/meanKn',
    ]);
    expect(problems.get('/departure')).toMatch(/does not exist/);
    expect(problems.get('/route/1/lat')).toMatch(/Latitude: 97 is over the possible -85 to 85/);
  });

  it('finds what only several fields together make impossible', () => {
    const draft = draftOf();
    const spot = readPlan({ ...draft, waypoints: [draft.waypoints[0]!, { ...draft.waypoints[0]!, id: 'other' }] });
    expect(spot.problems.get('/route/1')).toMatch(/on one spot/);
    const gust = readPlan({ ...draft, windRows: draft.windRows.map((row) => ({ ...row, gust: '3' })) });
    expect(gust.problems.get('/wind/rows/0/gustKn')).toMatch(/under the mean/);
    const order = readPlan({ ...draft, windRows: [...draft.windRows].reverse() });
    expect(order.problems.get('/wind/rows/1/time')).toMatch(/not after the row before/);
  });

  it('finds the field of a wrong stream row too', () => {
    const draft = draftFromPlan(buildPlan({ streamRows: stream }), 'UTC');
    const wrong = readPlan({ ...draft, streamRows: draft.streamRows.map((row) => ({ ...row, kn: '40' })) });
    expect(wrong.problems.get('/streamRows/0/kn')).toMatch(/over the possible/);
  });

  it('tells what is only empty from what is wrong', () => {
    const { plan, missing, problems } = readPlan(emptyDraft('A name', 'America/Vancouver'));
    expect(plan).toBeNull();
    for (const pointer of problems.keys()) expect(missing.has(pointer)).toBe(true);
    expect([...missing]).toEqual(
      expect.arrayContaining(['/departure', '/route', '/wind/source', '/wind/issuedAt', '/wind/rows']),
    );
  });
});
