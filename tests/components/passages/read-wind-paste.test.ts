import { describe, expect, it } from 'vitest';
import { readStreamPaste, readWindPaste } from '@/components/passages/read-wind-paste';

describe('readWindPaste', () => {
  it('reads commas with a heading, and a gust left out', () => {
    const { rows, problems } = readWindPaste(
      'time,from,mean,gust\n2026-06-01 09:00,240,12,17\n2026-06-01 12:00, 250, 14\n',
    );
    expect(problems).toEqual([]);
    expect(rows).toEqual([
      { time: { text: '2026-06-01 09:00', which: '' }, from: '240', mean: '12', gust: '17' },
      { time: { text: '2026-06-01 12:00', which: '' }, from: '250', mean: '14', gust: '' },
    ]);
  });

  it('reads tabs, with date and clock time in columns of their own', () => {
    const { rows } = readWindPaste('2026-06-01\t09:00\t240\t12\t17\r\n2026-06-01\t12:00\t250\t14\t');
    expect(rows.map((row) => [row.time.text, row.mean, row.gust])).toEqual([
      ['2026-06-01 09:00', '12', '17'],
      ['2026-06-01 12:00', '14', ''],
    ]);
  });

  it('keeps values that make no sense for their own fields to say so', () => {
    const { rows, problems } = readWindPaste('2026-06-01 09:00,west,300,7');
    expect(problems).toEqual([]);
    expect(rows[0]).toMatchObject({ from: 'west', mean: '300' });
  });

  it('names the lines with too few or too many columns', () => {
    const { problems } = readWindPaste('2026-06-01 09:00,240,12\n2026-06-01 12:00,250\n2026-06-01 15:00,1,2,3,4');
    expect(problems).toHaveLength(2);
    expect(problems[0]).toMatch(/^Line 2 has 2 columns/);
    expect(problems[1]).toMatch(/^Line 3 has 5 columns/);
  });

  it('reads stream rows of three columns', () => {
    expect(readStreamPaste('2026-06-01 09:00;320;1.5').rows).toEqual([
      { time: { text: '2026-06-01 09:00', which: '' }, toward: '320', kn: '1.5' },
    ]);
  });
});
