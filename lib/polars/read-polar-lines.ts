import type { PolarFinding } from '@/lib/polars/polar-finding';
import { POLAR_CSV_COLUMNS } from '@/lib/polars/write-polar-csv';
import type { Degrees, Knots } from '@/lib/units/quantities';

export interface PolarCell {
  readonly line: number;
  readonly windKn: Knots;
  readonly angleDeg: Degrees;
  readonly speedKn: Knots;
}

type Column = (typeof POLAR_CSV_COLUMNS)[number];

/** What is possible for a small craft; it catches crossed columns and units. */
const RANGES: Record<Column, { min: number; max: number; unit: string }> = {
  true_wind_speed_kn: { min: 0.5, max: 80, unit: 'kn' },
  true_wind_angle_deg: { min: 0, max: 180, unit: '°' },
  boat_speed_kn: { min: 0, max: 40, unit: 'kn' },
};
/** 60 winds by 181 angles, and the header. */
const MOST_LINES = 60 * 181 + 1;
const HEADER = POLAR_CSV_COLUMNS.join(',');

/** The cells of a polar's CSV, and what is wrong with single lines. */
export function readPolarLines(text: string): { cells: PolarCell[]; findings: PolarFinding[] } {
  const none = (line: number, message: string) => ({ cells: [], findings: [{ line, message }] });
  if (text.includes('\u0000')) return none(1, 'This is not a text file. Give the polar as CSV.');
  const lines = text.replace(/^\uFEFF/, '').split(/\r\n|\n|\r/);
  const headerIndex = lines.findIndex((line) => line.trim() !== '');
  if (headerIndex < 0) return none(1, `The file is empty. Its first line must be ${HEADER}.`);
  const order = columnsOf(lines[headerIndex]!);
  if (!order) return none(headerIndex + 1, `The first line must be ${HEADER}, with commas between.`);
  if (lines.length > MOST_LINES + headerIndex + 1) {
    return none(MOST_LINES, `More than ${MOST_LINES} lines: this is not a polar of at most 60 winds and 181 angles.`);
  }

  const cells: PolarCell[] = [];
  const findings: PolarFinding[] = [];
  lines.forEach((content, index) => {
    if (index <= headerIndex || content.trim() === '') return;
    const cell = readLine(content, index + 1, order, findings);
    if (cell) cells.push(cell);
  });
  return { cells, findings };
}

function columnsOf(header: string): Column[] | null {
  const names = fieldsOf(header).map((name) => name.toLowerCase());
  const complete = names.length === POLAR_CSV_COLUMNS.length && POLAR_CSV_COLUMNS.every((name) => names.includes(name));
  return complete ? (names as Column[]) : null;
}

function fieldsOf(line: string): string[] {
  return line.split(',').map((field) =>
    field
      .trim()
      .replace(/^"(.*)"$/, '$1')
      .trim(),
  );
}

function readLine(content: string, line: number, order: Column[], findings: PolarFinding[]): PolarCell | null {
  const fields = fieldsOf(content);
  if (fields.length !== order.length) {
    const why = `${fields.length} fields where three are wanted`;
    findings.push({ line, message: `Line ${line}: ${why}. Use commas between and a point as decimal sign.` });
    return null;
  }
  const values = {} as Record<Column, number>;
  const before = findings.length;
  order.forEach((column, index) => {
    const problem = problemOf(column, fields[index]!);
    if (problem) findings.push({ line, column, message: `Line ${line}, ${column}: ${problem}` });
    else values[column] = Number(fields[index]);
  });
  if (findings.length > before) return null;
  return {
    line,
    windKn: values.true_wind_speed_kn,
    angleDeg: values.true_wind_angle_deg,
    speedKn: values.boat_speed_kn,
  };
}

function problemOf(column: Column, field: string): string | null {
  if (field === '') return 'is empty. Fill it in, or take the whole wind or angle out.';
  if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(field)) return `“${field.slice(0, 40)}” is not a number.`;
  const { min, max, unit } = RANGES[column];
  const value = Number(field);
  return value >= min && value <= max ? null : `${field} is outside the possible ${min} to ${max} ${unit}.`;
}
