/**
 * The land index beside turf over whole polygons, in one run, so that the machine's speed drops out of the ratios:
 * `node --import tsx scripts/bench/land.ts`.
 */
import * as turf from '@turf/turf';
import { readFileSync } from 'node:fs';
import { buildLandIndex } from '@/lib/geo/land';
import type { LandFile } from '@/lib/geo/land-file';
import { readLand } from '@/lib/geo/read-land';

const { polygons, box } = readLand(JSON.parse(readFileSync('public/tiles-sample/land.json', 'utf8')) as LandFile);
const figures = polygons.map((rings) => turf.polygon(rings.map((ring) => ring.map((place) => [...place]))));
const shores = turf.featureCollection(figures.map((figure) => turf.polygonToLine(figure)).flatMap(flat));

function flat(line: ReturnType<typeof turf.polygonToLine>) {
  return line.type === 'FeatureCollection' ? line.features : [line];
}

/** The same places every run: a 32-bit linear congruential sequence, constants of Numerical Recipes. */
let seed = 20_260_701;
function next(): number {
  seed = (Math.imul(seed, 1_664_525) + 1_013_904_223) >>> 0;
  return seed / 2 ** 32;
}
const place = () => ({
  lat: box.south + next() * (box.north - box.south),
  lon: box.west + next() * (box.east - box.west),
});

const lines = Array.from({ length: 2000 }, () => {
  const from = place();
  // A step of five minutes at six knots is half a mile, about 0.008 degrees.
  return { from, to: { lat: from.lat + (next() - 0.5) * 0.016, lon: from.lon + (next() - 0.5) * 0.016 } };
});

/** Microseconds a call over the first `count` lines, the best of three rounds. */
function timed(count: number, call: (line: (typeof lines)[number]) => unknown): number {
  const rounds = [0, 1, 2].map(() => {
    const start = performance.now();
    for (const line of lines.slice(0, count)) call(line);
    return ((performance.now() - start) * 1000) / count;
  });
  return Math.min(...rounds);
}

const started = performance.now();
const index = buildLandIndex(polygons, box);
console.log(`build the index: ${(performance.now() - started).toFixed(1)} ms`);

const rows = [
  [
    'is it land',
    timed(2000, ({ from }) => index.isLand(from)),
    timed(300, ({ from }) => figures.some((figure) => turf.booleanPointInPolygon([from.lon, from.lat], figure))),
  ],
  [
    'does a step cross land',
    timed(2000, ({ from, to }) => index.crossesLand(from, to)),
    timed(5, ({ from, to }) => {
      const step = turf.lineString([
        [from.lon, from.lat],
        [to.lon, to.lat],
      ]);
      return shores.features.some((shore) => turf.lineIntersect(step, shore as never).features.length > 0);
    }),
  ],
  [
    'distance to shore',
    timed(2000, ({ from }) => index.distanceToShoreM(from)),
    timed(5, ({ from }) =>
      Math.min(...shores.features.map((shore) => turf.pointToLineDistance([from.lon, from.lat], shore as never))),
    ),
  ],
] as const;

for (const [what, ours, baseline] of rows) {
  const ratio = baseline / ours;
  console.log(`${what}: ${ours.toFixed(2)} µs; turf ${baseline.toFixed(1)} µs; ${ratio.toFixed(0)} times as fast`);
}
