import { z } from 'zod';
import type { CheckResult, Flag } from '@/lib/passages/passage';

const instant = z.iso.datetime();
const state = z.enum(['within', 'thin', 'beyond', 'unknown']).describe('thin: little margin; unknown: not known');
const end = z.enum(['A', 'B']);

export const flagSchema = z.object({
  code: z.custom<Flag['code']>().meta({ type: 'string', description: 'a kebab-case word' }),
  severity: z.enum(['danger', 'caution', 'notice']),
  at: instant.nullable(),
  lat: z.number().nullable(),
  lon: z.number().nullable(),
  numbers: z.record(z.string(), z.number()),
});

const reefCallSchema = z.object({
  reef: z.string(),
  at: instant.describe('when it is called'),
  by: instant.describe('when the wind asks for it'),
  lat: z.number(),
  lon: z.number(),
  meanKn: z.number(),
  gustKn: z.number(),
});

const legSchema = z.object({
  from: z.string(),
  to: z.string(),
  courseDeg: z.number(),
  distanceNmi: z.number(),
  sailedNmi: z.number().nullable(),
  start: instant.nullable(),
  end: instant.nullable(),
  mode: z.enum(['direct', 'boards']).nullable(),
  leadingEnd: z.enum(['A', 'B', 'both']).nullable(),
  shunts: z.number().int(),
  reefCalls: z.array(reefCallSchema),
  largestLoadShare: z.number().nullable(),
  largestLoadShareAtRest: z.number().nullable(),
  heelingMomentNewtonM: z.number().nullable(),
  rightingMomentNewtonM: z.number().nullable(),
  heelDeg: z.number().nullable(),
  state,
  flags: z.array(flagSchema),
  track: z.array(z.tuple([z.number(), z.number(), instant, end])).describe('[lon, lat, time, leading end]'),
});

/** The reply of POST /api/check. */
export const checkReplySchema = z.object({
  engineVersion: z.string(),
  caution: z.string(),
  state,
  totals: z.object({
    distanceNmi: z.number(),
    sailedNmi: z.number(),
    hours: z.number().nullable(),
    arrival: instant.nullable(),
    shunts: z.number().int(),
    largestLoadShare: z.number().nullable(),
  }),
  legs: z.array(legSchema),
  warnings: z.array(flagSchema.extend({ message: z.string() })),
});

/** The schema and the engine's type say the same: neither can change alone. */
type Same<A, B> = A extends B ? (B extends A ? true : never) : never;
type Mutable<T> = T extends readonly (infer Item)[]
  ? number extends T['length']
    ? Mutable<Item>[]
    : { -readonly [Key in keyof T]: Mutable<T[Key]> }
  : T extends number
    ? number
    : T extends object
      ? { -readonly [Key in keyof T]: Mutable<T[Key]> }
      : T;
const sameAsEngine: Same<z.output<typeof checkReplySchema>, Mutable<CheckResult>> = true;
void sameAsEngine;
