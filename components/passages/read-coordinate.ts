export type Axis = 'lat' | 'lon';
export type Reading<Value> = { readonly value: Value } | { readonly problem: string };

const AXES = {
  lat: { what: 'Latitude', plus: 'N', minus: 'S', example: '48.535 or 48°32.1′N' },
  lon: { what: 'Longitude', plus: 'E', minus: 'W', example: '-123.0312 or 123°01.9′W' },
} as const;

/**
 * Reads a latitude or longitude in degrees: decimal (−123.0312), degrees and minutes (123°01.9′W) or degrees, minutes
 * and seconds. North and east are positive. Without a letter the sign says the hemisphere; both at once is refused, as
 * is a letter of the other axis. The range is the schema's business.
 */
export function readCoordinate(text: string, axis: Axis): Reading<number> {
  const { what, plus, minus, example } = AXES[axis];
  const tidy = text
    .trim()
    .toUpperCase()
    .replaceAll('−', '-')
    .replace(/^([+-]?\d+),(\d+)/, '$1.$2');
  if (tidy === '') return { problem: `${what}: give degrees, for example ${example}.` };
  const letters = tidy.match(/[A-Z]/g) ?? [];
  const letter = letters[0];
  if (letters.length > 1 || (letter && !/^[A-Z]|[A-Z]$/.test(tidy))) {
    return { problem: `${what}: “${text.trim()}” cannot be read. Write ${example}.` };
  }
  if (letter && letter !== plus && letter !== minus) {
    return { problem: `${what}: ends in ${letter}, but takes ${plus} or ${minus}. Write ${example}.` };
  }
  const parts = readParts(tidy.replace(/[A-Z]/g, ' '));
  if (!parts) return { problem: `${what}: “${text.trim()}” cannot be read. Write ${example}.` };
  if (parts.minutes >= 60 || parts.seconds >= 60) {
    return { problem: `${what}: minutes and seconds must be under 60. Write ${example}.` };
  }
  if (letter && parts.signed) {
    return { problem: `${what}: give a sign or the letter ${letter}, not both.` };
  }
  const degrees = parts.degrees + parts.minutes / 60 + parts.seconds / 3600;
  return { value: letter === minus || parts.negative ? -degrees : degrees };
}

interface Parts {
  readonly signed: boolean;
  readonly negative: boolean;
  readonly degrees: number;
  readonly minutes: number;
  readonly seconds: number;
}

const PATTERN = /^([+-]?)(\d+(?:\.\d*)?)(?:[°\s]+(\d+(?:\.\d*)?)(?:['′’\s]+(\d+(?:\.\d*)?)["″”]?)?['′’]?)?[°\s]*$/;

function readParts(text: string): Parts | null {
  const match = PATTERN.exec(text.trim());
  if (!match) return null;
  const [, sign, degrees, minutes, seconds] = match;
  const whole = (value: string | undefined) => value === undefined || /^\d+$/.test(value);
  if ((minutes !== undefined && !whole(degrees)) || (seconds !== undefined && !whole(minutes))) return null;
  return {
    signed: sign !== '',
    negative: sign === '-',
    degrees: Number(degrees),
    minutes: Number(minutes ?? 0),
    seconds: Number(seconds ?? 0),
  };
}
