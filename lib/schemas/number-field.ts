import { z } from 'zod';

interface NumberFieldOptions {
  /** What the field is, as a sailor would say it: "Span", "Corridor half-width". */
  readonly what: string;
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  /** How to mend a value under or over the range, where there is more to say than the unit: mostly a wrong sign. */
  readonly hintUnder?: string;
  readonly hintOver?: string;
}

/**
 * A number with a range that is possible for a small craft, and a message that says what is wrong, where
 * and how to mend it. The ranges catch crossed units (0.5 m written as 500), not poor design.
 */
export function numberField({ what, unit, min, max, hintUnder, hintOver }: NumberFieldOptions) {
  const range = `${min} to ${max}${unit ? ` ${unit}` : ''}`;
  const checkUnit = unit ? `Check the unit: it is given in ${unit}.` : 'Check the value.';
  return z
    .number({ error: `${what}: give a number${unit ? ` in ${unit}` : ''}, ${range}.` })
    .min(min, {
      error: (issue) => `${what}: ${String(issue.input)} is under the possible ${range}. ${hintUnder ?? checkUnit}`,
    })
    .max(max, {
      error: (issue) => `${what}: ${String(issue.input)} is over the possible ${range}. ${hintOver ?? checkUnit}`,
    });
}

/** A short text that must be given. */
export function nameField(what: string, max = 80) {
  return z
    .string({ error: `${what}: give a text.` })
    .trim()
    .min(1, { error: `${what}: give at least one character.` })
    .max(max, { error: `${what}: at most ${max} characters.` })
    .refine((text) => isStorable(text) && !/[\n\r\t]/.test(text), {
      error: `${what}: it holds characters that cannot be shown. Type it again on one line.`,
    });
}

/** No control characters and no halves of characters: PostgreSQL stores neither. Line ends and tabs may stand. */
export function isStorable(text: string): boolean {
  return !/[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/.test(text) && !/\p{Cs}/u.test(text);
}

/** ISO 8601 with an offset, e.g. 2026-06-01T16:00:00Z or 2026-06-01T09:00:00-07:00. */
export function instantField(what: string) {
  return z.iso.datetime({
    offset: true,
    error: `${what}: give a date and time that exists, as ISO 8601 with its offset, for example 2026-06-01T16:00:00Z.`,
  });
}
