import type { NewStreamRow, NewWindRow } from './plan-actions';

export interface Pasted<Row> {
  readonly rows: readonly Row[];
  readonly problems: readonly string[];
}

/**
 * Reads pasted wind rows: time, from °true, mean kn and, where given, gust kn; separated by tabs, commas or semicolons;
 * date and time in one column or two. A heading line is passed over. Values are kept as typed and checked at their
 * fields later; only lines with too few or too many columns are named here.
 */
export function readWindPaste(text: string): Pasted<NewWindRow> {
  return readPaste(text, 'time, from, mean and, where given, gust', [3, 4], ([time, from, mean, gust]) => ({
    time: { text: time ?? '', which: '' },
    from: from ?? '',
    mean: mean ?? '',
    gust: gust ?? '',
  }));
}

/** The same for the stream: time, toward °true, kn. */
export function readStreamPaste(text: string): Pasted<NewStreamRow> {
  return readPaste(text, 'time, toward and knots', [3, 3], ([time, toward, kn]) => ({
    time: { text: time ?? '', which: '' },
    toward: toward ?? '',
    kn: kn ?? '',
  }));
}

function readPaste<Row>(
  text: string,
  columns: string,
  [least, most]: readonly [number, number],
  toRow: (cells: readonly string[]) => Row,
): Pasted<Row> {
  const rows: Row[] = [];
  const problems: string[] = [];
  text.split(/\r\n|\r|\n/).forEach((line, index) => {
    if (line.trim() === '') return;
    const cells = joinDate(splitLine(line));
    if (rows.length === 0 && problems.length === 0 && isHeading(cells)) return;
    if (cells.length < least || cells.length > most) {
      problems.push(
        `Line ${index + 1} has ${cells.length === 1 ? '1 column' : `${cells.length} columns`}; it needs ${columns}.`,
      );
      return;
    }
    rows.push(toRow(cells));
  });
  return { rows, problems };
}

function splitLine(line: string): string[] {
  const separator = line.includes('\t') ? '\t' : line.includes(';') ? ';' : ',';
  const cells = line.split(separator).map((cell) => cell.trim().replace(/^"(.*)"$/, '$1'));
  while (cells.length > 0 && cells[cells.length - 1] === '') cells.pop();
  return cells;
}

/** A date in a column of its own takes the clock time of the next. */
function joinDate(cells: string[]): string[] {
  const [date, clock, ...rest] = cells;
  if (date && clock && /^\d{4}-\d{1,2}-\d{1,2}$/.test(date) && /^\d{1,2}:?\d{2}(:00)?$/.test(clock)) {
    return [`${date} ${clock}`, ...rest];
  }
  return cells;
}

function isHeading(cells: readonly string[]): boolean {
  return cells.every((cell) => !/\d/.test(cell));
}
