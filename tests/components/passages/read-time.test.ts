import { describe, expect, it } from 'vitest';
import { readTime, timeToDraft } from '@/components/passages/read-time';

const zone = 'America/Vancouver';
const at = (text: string, which: '' | 'earlier' | 'later' = '') => readTime({ text, which }, zone);

describe('readTime', () => {
  it('reads a time in the zone, with or without a T or a colon', () => {
    for (const text of ['2026-06-01 09:00', '2026-06-01T09:00', '2026-06-01 0900', '2026-6-1 9:00']) {
      expect(at(text)).toEqual({ kind: 'instant', epochMs: Date.UTC(2026, 5, 1, 16), twice: false });
    }
  });

  it('reads an instant with its offset', () => {
    expect(at('2026-06-01T16:00:00Z')).toMatchObject({ epochMs: Date.UTC(2026, 5, 1, 16) });
  });

  it('says that a time the clocks skip does not exist', () => {
    const reading = at('2026-03-08 02:30');
    expect(reading.kind).toBe('problem');
    expect(reading.kind === 'problem' && reading.message).toMatch(/does not exist in America\/Vancouver/);
  });

  it('asks which where the clocks go back, and takes the answer', () => {
    const both = at('2026-11-01 01:30');
    expect(both).toEqual({
      kind: 'which',
      earlierMs: Date.UTC(2026, 10, 1, 8, 30),
      laterMs: Date.UTC(2026, 10, 1, 9, 30),
    });
    expect(at('2026-11-01 01:30', 'later')).toEqual({
      kind: 'instant',
      epochMs: Date.UTC(2026, 10, 1, 9, 30),
      twice: true,
    });
  });

  it.each(['tomorrow', '2026-02-30 10:00', '2026-06-01 24:30', '2026-06-01'])('refuses %s in words', (text) => {
    expect(at(text).kind).toBe('problem');
  });

  it('writes instants so that they read back the same, also in the hour that happens twice', () => {
    for (const ms of [
      Date.UTC(2026, 5, 1, 16),
      Date.UTC(2026, 10, 1, 8, 30),
      Date.UTC(2026, 10, 1, 9, 30),
      1_780_000_000_123,
    ]) {
      expect(readTime(timeToDraft(ms, zone), zone)).toMatchObject({ kind: 'instant', epochMs: ms });
    }
  });
});
