import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { callsOverTime, DEFAULT_TIMING, type ReefNeed } from '@/lib/reef-calls/calls-over-time';

const minutes = (value: number) => value * 60_000;
const needs = (...pairs: [minute: number, reefIndex: number][]): ReefNeed[] =>
  pairs.map(([minute, reefIndex]) => ({ from: minutes(minute), reefIndex }));
const inMinutes = (calls: ReturnType<typeof callsOverTime>) =>
  calls.map((call) => [call.reefIndex, call.at / 60_000, call.by / 60_000]);

describe('callsOverTime', () => {
  it('calls the first reef at the start', () => {
    expect(inMinutes(callsOverTime(needs([0, 1]), minutes(60)))).toEqual([[1, 0, 0]]);
  });

  it('calls a deeper reef a quarter of an hour before it is needed', () => {
    expect(inMinutes(callsOverTime(needs([0, 0], [40, 2]), minutes(90)))).toEqual([
      [0, 0, 0],
      [2, 25, 40],
    ]);
  });

  it('cannot call before the departure', () => {
    expect(inMinutes(callsOverTime(needs([0, 0], [10, 2]), minutes(90)))).toEqual([[2, 0, 10]]);
  });

  it('shakes a reef out only after the lull has held for half an hour', () => {
    expect(inMinutes(callsOverTime(needs([0, 2], [20, 0]), minutes(120)))).toEqual([
      [2, 0, 0],
      [0, 50, 50],
    ]);
  });

  it('does not flap in a short lull', () => {
    expect(inMinutes(callsOverTime(needs([0, 2], [20, 0], [45, 2]), minutes(120)))).toEqual([[2, 0, 0]]);
  });

  it('goes straight to the deeper of two that follow at once', () => {
    expect(inMinutes(callsOverTime(needs([0, 0], [40, 1], [42, 2]), minutes(120)))).toEqual([
      [0, 0, 0],
      [2, 25, 40],
    ]);
  });

  const anyNeeds = fc
    .array(fc.tuple(fc.integer({ min: 1, max: 90 }), fc.integer({ min: 0, max: 3 })), { minLength: 1, maxLength: 12 })
    .map((steps) => {
      let time = 0;
      return steps.map(([minute, reefIndex], index) => {
        time += index === 0 ? 0 : minute;
        return { from: minutes(time), reefIndex };
      });
    });

  it('never carries more sail than the instant asks for', () => {
    fc.assert(
      fc.property(anyNeeds, (list) => {
        const end = list[list.length - 1]!.from + minutes(30);
        const calls = callsOverTime(list, end);
        for (const need of list) {
          const carried = calls.filter((call) => call.at <= need.from).pop()!;
          expect(carried.reefIndex).toBeGreaterThanOrEqual(need.reefIndex);
        }
      }),
    );
  });

  it('calls less sail before it is needed, never more than the lead ahead', () => {
    fc.assert(
      fc.property(anyNeeds, (list) => {
        const calls = callsOverTime(list, list[list.length - 1]!.from + minutes(30));
        calls.slice(1).forEach((call, index) => {
          if (call.reefIndex > calls[index]!.reefIndex) {
            expect(call.by - call.at).toBeLessThanOrEqual(DEFAULT_TIMING.leadMs);
            expect(call.by).toBeGreaterThan(call.at);
          } else expect(call.by).toBe(call.at);
        });
      }),
    );
  });
});
