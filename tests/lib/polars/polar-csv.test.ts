import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readPolarCsv } from '@/lib/polars/read-polar-csv';
import { writePolarCsv } from '@/lib/polars/write-polar-csv';

const HEADER = 'true_wind_speed_kn,true_wind_angle_deg,boat_speed_kn';
const csv = (...lines: string[]) => [HEADER, ...lines].join('\n');
function messagesOf(text: string): string[] {
  const reading = readPolarCsv(text);
  return 'findings' in reading ? reading.findings.map((finding) => finding.message) : [];
}

describe('reading a polar', () => {
  it('takes lines in any order, columns in any order, quotes, blank lines and Windows line ends', () => {
    const text =
      '\uFEFF\r\nboat_speed_kn,"true_wind_speed_kn", true_wind_angle_deg\r\n7,10,90\r\n\r\n5,10,60\r\n4,6,90\r\n3,6,60\r\n';
    expect(readPolarCsv(text)).toEqual({
      polar: {
        windSpeedsKn: [6, 10],
        windAnglesDeg: [60, 90],
        speedsKn: [
          [3, 4],
          [5, 7],
        ],
      },
    });
  });

  it('names every hole', () => {
    const messages = messagesOf(csv('6,60,3', '6,90,4', '10,60,5', '14,90,6'));
    expect(messages).toHaveLength(2);
    expect(messages[0]).toContain('No boat speed for 10 kn at 90°');
    expect(messages[1]).toContain('No boat speed for 14 kn at 60°');
  });

  it('names line and column of what is not a number, empty or out of range', () => {
    const reading = readPolarCsv(csv('6,60,fast', '6,,4', '300,60,5', '10,200,5', '10,90,-1'));
    expect(reading).toMatchObject({
      findings: [
        { line: 2, column: 'boat_speed_kn' },
        { line: 3, column: 'true_wind_angle_deg' },
        { line: 4, column: 'true_wind_speed_kn' },
        { line: 5, column: 'true_wind_angle_deg' },
        { line: 6, column: 'boat_speed_kn' },
      ],
    });
  });

  it('names a wind and angle that were given twice', () => {
    const messages = messagesOf(csv('6,60,3', '6,90,4', '6,60,3.5'));
    expect(messages).toEqual(['Line 4: 6 kn at 60° was given in line 2 already. Keep one of them.']);
  });

  it.each([
    ['', 'empty'],
    ['a,b,c\n1,2,3', 'first line must be'],
    [HEADER, 'no lines under the header'],
    [csv('6,60,3'), 'at least two wind angles'],
    [csv('6;60;3'), 'fields where three are wanted'],
    [csv('6,60,3,5'), '4 fields'],
    ['PK\u0003\u0004\u0000\u0000', 'not a text file'],
    [csv(...Array.from({ length: 12_000 }, () => '6,60,3')), 'More than'],
  ])('refuses a file that is not a polar', (text, why) => {
    expect(messagesOf(text).join(' ')).toContain(why);
  });

  it('does not drown the owner in findings', () => {
    expect(messagesOf(csv(...Array.from({ length: 200 }, () => 'x,y,z'))).length).toBeLessThanOrEqual(50);
  });

  it('reads back what is written', () => {
    const speeds = fc.array(
      fc.array(
        fc.double({ min: 0, max: 40, noNaN: true }).map((v) => v + 0),
        { minLength: 3, maxLength: 3 },
      ),
      {
        minLength: 2,
        maxLength: 2,
      },
    );
    fc.assert(
      fc.property(speeds, (speedsKn) => {
        const polar = { windSpeedsKn: [6, 12.5], windAnglesDeg: [55, 90, 150], speedsKn };
        expect(readPolarCsv(writePolarCsv(polar))).toEqual({ polar });
      }),
    );
  });

  it('never throws, whatever the text', () => {
    const character = fc.oneof(
      fc.constantFrom(...'0123456789.,;-+eE"\n\r\t '),
      fc.integer({ min: 0, max: 0xffff }).map((code) => String.fromCharCode(code)),
    );
    fc.assert(
      fc.property(
        fc.array(character, { maxLength: 200 }).map((characters) => characters.join('')),
        (text) => {
          const reading = readPolarCsv(`${HEADER}\n${text}`);
          expect('polar' in reading || reading.findings.length > 0).toBe(true);
        },
      ),
    );
  });
});
