import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { resultAsOfNow } from '@/components/passages/as-of-now';
import { ResultView } from '@/components/passages/result-view';
import { Verdict } from '@/components/passages/verdict';
import { ReefCallList } from '@/components/reef-calls/reef-call-list';
import { buildCheckResult, buildLeg, buildPlan, buildSecondLeg, buildSheet } from '../../builders/check-result';

const sheet = buildSheet();
const reefNames = sheet.reefs.map((reef) => reef.name);
afterEach(cleanup);

function show(result = buildCheckResult(), plan = buildPlan()) {
  render(<ResultView result={result} plan={plan} sheet={sheet} selectedLeg={null} onSelectLeg={() => undefined} />);
  return within(screen.getByTestId('legs-table')).getAllByRole('row');
}

describe('Verdict', () => {
  it('names the worst leg, its state in words and why, with the caution', () => {
    render(<Verdict result={buildCheckResult()} plan={buildPlan()} reefNames={reefNames} />);
    expect(screen.getByRole('heading', { name: 'Beyond righting moment' })).toBeTruthy();
    expect(screen.getByTestId('worst-leg').textContent).toBe(
      'Worst: leg 2, the point to the narrows — beyond righting moment',
    );
    expect(screen.getByTestId('verdict').textContent).toMatch(
      /Leg 2, 10:35, .*: gust 24 kn gives 1\.31 × her righting moment with “one panel in”/,
    );
    expect(screen.getByTestId('caution').textContent).toMatch(/not a permission/);
  });

  it('gives the reason that makes the state, not a graver flag beside it', () => {
    const over = { code: 'forecast-over', severity: 'danger', at: null, lat: null, lon: null, numbers: {} } as const;
    const leg = buildSecondLeg();
    const result = buildCheckResult({ legs: [buildLeg(), { ...leg, flags: [over, ...leg.flags] }] });
    render(<Verdict result={result} plan={buildPlan()} reefNames={reefNames} />);
    expect(screen.getByTestId('verdict').textContent).toMatch(/gust 24 kn gives 1\.31/);
  });
});

describe('ResultView', () => {
  it('tells each leg in numbers with units and times of the zone', () => {
    const [, first, second] = show();
    expect(first!.textContent).toMatch(/180° T · 16[45]° M/);
    expect(first!.textContent).toContain('5.00 nmi');
    expect(first!.textContent).toContain('163 kg·m (1,600 N·m)');
    expect(first!.textContent).toContain('326 kg·m (3,200 N·m)');
    expect(first!.textContent).toContain('09:00–10:00 UTC−7');
    expect(first!.textContent).toContain('B leads');
    expect(first!.textContent).toContain('95°, then 100° to starboard');
    expect(first!.textContent).toContain('within limits');
    expect(second!.textContent).toContain('in boards, 4.80 nmi sailed');
    expect(second!.textContent).toContain('A and B in turn');
    expect(second!.textContent).toContain('1 shunt');
    expect(second!.textContent).toContain('one panel in, by 10:30');
    expect(second!.textContent).toContain('1.31');
    expect(second!.textContent).toContain('beyond righting moment');
  });

  it('says the same on the cards of a phone', () => {
    show();
    const cards = within(screen.getByTestId('leg-cards')).getAllByRole('listitem');
    const text = cards.map((card) => card.textContent).join(' ');
    for (const fact of [
      '163 kg·m (1,600 N·m)',
      '1.31',
      'one panel in, by 10:30',
      'beyond righting moment',
      '4.80 nmi',
    ]) {
      expect(text).toContain(fact);
    }
  });

  it('says “not known” of a leg that was never reached, and shows it no beam', () => {
    const never = buildLeg({
      start: null,
      end: null,
      mode: null,
      leadingEnd: null,
      reefCalls: [],
      largestLoadShare: null,
      heelingMomentNewtonM: null,
      rightingMomentNewtonM: null,
      sailedNmi: null,
      state: 'unknown',
      track: [],
    });
    const totals = { ...buildCheckResult().totals, arrival: null, hours: null };
    const [, , row] = show(buildCheckResult({ legs: [buildLeg(), never], totals, state: 'unknown' }));
    expect(row!.textContent).toContain('not reached');
    expect(row!.querySelector('[aria-label^="The beam"]')).toBeNull();
    expect(row!.querySelector('[data-state="unknown"]')).not.toBeNull();
    expect(screen.getByTestId('totals').textContent).toContain('Arrivalnot known');
  });

  it('gives reasons with what may be done, and the working with its numbers', () => {
    show();
    expect(screen.getByTestId('reasons').textContent).toContain('Do not count on sailing this.');
    const working = screen.getByText(/Show working of leg 2/).closest('details')!;
    expect(working.textContent).toContain('9.80665 × 326.3 kg·m');
    // 4,192 N·m on 9 m² at 2.2 m with C 1.4: ½·1.225·1.4·9·2.2 = 16.98, so V = 15.71 m/s, 30.5 kn.
    expect(working.textContent).toContain('30.5 kn');
  });
});

describe('ReefCallList', () => {
  it('lists a reef once, with when, by when, where and for what wind', () => {
    render(<ReefCallList legs={buildCheckResult().legs} plan={buildPlan()} reefNames={reefNames} />);
    const calls = within(screen.getByTestId('reef-calls')).getAllByRole('listitem');
    expect(calls.map((call) => call.textContent)).toEqual([
      'Start with full sailfrom 09:00 UTC−7, leg 1, 1.8 nmi before the point; for mean 18 kn, gust 24 kn',
      expect.stringMatching(/^Reef: one panel incall at 10:15, in by 10:30 UTC−7, leg 2, /),
    ]);
  });
});

describe('resultAsOfNow', () => {
  const issued = '2026-06-01T12:00:00.000Z';
  it('keeps a fresh check as it is', () => {
    const result = buildCheckResult();
    expect(resultAsOfNow(result, issued, Date.parse('2026-06-01T20:00:00Z'))).toMatchObject({ result, hasAged: false });
  });

  it('makes what an old forecast allowed not known, and leaves beyond as it is', () => {
    const old = resultAsOfNow(buildCheckResult(), issued, Date.parse('2026-06-02T01:00:00Z'));
    expect(old.hasAged).toBe(true);
    expect(old.result.legs.map((leg) => leg.state)).toEqual(['unknown', 'beyond']);
    expect(old.result.state).toBe('beyond');
  });
});
