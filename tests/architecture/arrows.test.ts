import { ESLint } from 'eslint';
import { describe, expect, it } from 'vitest';
import { mayImport } from '@/scripts/lint/may-import.mjs';

/** One linter for all: it starts the type checker once. Texts are linted as if they stood in an existing file. */
const eslint = new ESLint();

async function rulesBroken(file: string, text: string): Promise<(string | null)[]> {
  const [result] = await eslint.lintText(text, { filePath: file });
  return (result?.messages ?? []).map((message) => message.ruleId);
}

describe('lint', { timeout: 300_000 }, () => {
  const arrow = 'twobow/arrows';
  it.each([
    [
      'a database client in rigging',
      arrow,
      'lib/rigging/craft.ts',
      "import knex from 'knex';\nexport const db = knex({});",
    ],
    ['polars in rigging', arrow, 'lib/rigging/craft.ts', "export type { Polar } from '@/lib/polars/polar';"],
    ['rigging in polars', arrow, 'lib/polars/polar.ts', "export type { Craft } from '../rigging/craft';"],
    ['a lazy import', arrow, 'lib/passages/passage.ts', "export const db = () => import('@/db/knex');"],
    ['an imported type', arrow, 'lib/rigging/craft.ts', "export type P = import('@/lib/passages/passage').Passage;"],
    ['a re-export of everything', arrow, 'lib/weather/series.ts', "export * from 'node:fs';"],
    ['a clock in the core', 'no-restricted-syntax', 'lib/rigging/craft.ts', 'export const now = () => Date.now();'],
    ['a date of now', 'no-restricted-syntax', 'lib/rigging/craft.ts', 'export const now = () => new Date();'],
    ['chance in the core', 'no-restricted-syntax', 'lib/rigging/craft.ts', 'export const x = () => Math.random();'],
    ['a setting in the core', 'no-restricted-globals', 'lib/rigging/craft.ts', 'export const x = process.pid;'],
    ['a setting read elsewhere', 'no-restricted-syntax', 'lib/web/log.ts', 'export const x = process.env.PORT;'],
    ['a floating promise', '@typescript-eslint/no-floating-promises', 'lib/web/log.ts', 'Promise.resolve(1);'],
    ['a file over 300 lines', 'max-lines', 'lib/web/log.ts', `export {};\n${'//\n'.repeat(301)}`],
    [
      'a test that does not run',
      'no-restricted-syntax',
      'tests/architecture/arrows.test.ts',
      'it.skip("x", () => {});',
    ],
  ])('refuses %s (%s)', async (_what, rule, file, text) => {
    expect(await rulesBroken(file, text)).toContain(rule);
  });

  it('lets pass what the core may load', async () => {
    expect(await rulesBroken('lib/rigging/craft.ts', "export type { Knots } from '@/lib/units/quantities';")).toEqual(
      [],
    );
  });
});

describe('arrows', () => {
  it.each([
    ['lib/units/constants.ts', '@/lib/errors'],
    ['lib/geo/rhumb.ts', '@/lib/rigging/craft'],
    ['lib/weather/wind-at.ts', '@/lib/passages/passage'],
    ['lib/passages/step.ts', '@/lib/reef-calls/call'],
    ['lib/reef-calls/call.ts', '@/lib/passage-check/check-passage'],
    ['lib/passages/step.ts', 'left-pad'],
    ['lib/schemas/boat.ts', '@/lib/web/route'],
    ['lib/env.ts', '@/lib/units/constants'],
    ['app/(crew)/page.tsx', '@/db/knex'],
    ['app/page.tsx', 'knex'],
    ['components/boats/card.tsx', '@/db/stores/boats'],
    ['components/boats/card.tsx', '@/lib/web/session'],
    ['components/ui/button.tsx', '@/lib/rigging/craft'],
    ['components/ui/button.tsx', '@/components/boats/card'],
    ['components/boats/card.tsx', 'maplibre-gl'],
    ['components/passages/legs.tsx', 'react-map-gl/maplibre'],
    ['components/map/map.tsx', 'd3-scale'],
    ['db/stores/boats.ts', '@/lib/usecases/boats/open-boat'],
    ['lib/usecases/boats/open-boat.ts', 'next/headers'],
    ['lib/usecases/boats/open-boat.ts', '@/lib/adapters/mail'],
    ['lib/usecases/boats/open-boat.ts', '@/lib/env'],
    ['lib/adapters/mail.ts', '@/lib/usecases/context'],
    ['lib/client/worker.ts', '@/lib/web/route'],
    ['migrations/0001_users.ts', '@/db/knex'],
    ['proxy.ts', '@/db/knex'],
  ])('%s must not import %s', (file, specifier) => {
    expect(mayImport(file, specifier).allowed).toBe(false);
  });

  it.each([
    ['lib/passages/step.ts', '../rigging/craft'],
    ['lib/passage-check/check-passage.ts', '@/lib/reef-calls/call'],
    ['lib/usecases/boats/open-boat.ts', '@/db/stores/boats'],
    ['app/page.tsx', '@/lib/usecases/boats/open-boat'],
    ['app/page.tsx', '@/components/ui/button'],
    ['components/map/map.tsx', 'maplibre-gl/dist/maplibre-gl.css'],
    ['components/charts/beam.tsx', 'd3-scale'],
    ['lib/client/worker.ts', '@/lib/passage-check/check-passage'],
  ])('%s may import %s', (file, specifier) => {
    expect(mayImport(file, specifier).allowed).toBe(true);
  });
});
