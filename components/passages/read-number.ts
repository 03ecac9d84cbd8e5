/** A typed number; a comma may stand for the point. NaN where it cannot be read, so that the schema's message shows. */
export function readNumber(text: string): number {
  const tidy = text
    .trim()
    .replace('−', '-')
    .replace(/^([+-]?\d+),(\d+)$/, '$1.$2');
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(tidy) ? Number(tidy) : Number.NaN;
}

/** The same, undefined where nothing was typed. */
export function readOptionalNumber(text: string): number | undefined {
  return text.trim() === '' ? undefined : readNumber(text);
}
