import type { Ama, Mass, Reef } from '@/lib/rigging/craft';
import type { Polar, Leeway } from '@/lib/polars/polar';

interface Contradicting {
  readonly masses: readonly Mass[];
  readonly ama?: Ama | undefined;
  readonly reefs: readonly Reef[];
  readonly polar: Polar;
  readonly closestAngleDeg?: number | undefined;
  readonly deepestAngleDeg?: number | undefined;
  readonly leewayDeg: Leeway;
}

interface IssueSink {
  addIssue(issue: { code: 'custom'; path: (string | number)[]; message: string }): void;
}

/** Checks that need several fields together: well formed, but impossible. Adds one issue a finding. */
export function findBoatContradictions(boat: Contradicting, context: IssueSink): void {
  const report = (path: (string | number)[], message: string) => context.addIssue({ code: 'custom', path, message });
  checkMasses(boat.masses, report);
  checkReefs(boat.reefs, report);
  checkPolar(boat.polar, report);
  checkAngles(boat, report);
}

type Report = (path: (string | number)[], message: string) => void;

function checkMasses(masses: readonly Mass[], report: Report): void {
  const momentKgM = masses.reduce((sum, mass) => sum + mass.kg * mass.yM, 0);
  if (momentKgM <= 0) {
    report(
      ['masses'],
      `Masses: Σ kg·y is ${momentKgM.toFixed(1)} kg·m, so she has no righting moment. Check the signs of y: positive from the vaka toward the ama.`,
    );
  }
  masses.forEach((mass, index) => {
    if (/\bama\b/i.test(mass.label) && mass.yM < 0) {
      report(
        ['masses', index, 'yM'],
        `${mass.label}: y = ${mass.yM} m puts the ama to leeward. It is kept to windward: give y as a positive number.`,
      );
    }
  });
}

function checkReefs(reefs: readonly Reef[], report: Report): void {
  const names = new Set<string>();
  reefs.forEach((reef, index) => {
    const before = reefs[index - 1];
    if (before && reef.areaM2 > before.areaM2) {
      report(
        ['reefs', index, 'areaM2'],
        `Reef table: “${reef.name}” has ${reef.areaM2} m², more than “${before.name}” above it (${before.areaM2} m²). List full sail first and the least sail last.`,
      );
    }
    if (names.has(reef.name)) {
      report(['reefs', index, 'name'], `Reef table: two rows are called “${reef.name}”. Give each its own name.`);
    }
    names.add(reef.name);
    if (
      reef.carryUpToGustKn !== undefined &&
      reef.carryUpToMeanKn !== undefined &&
      reef.carryUpToGustKn < reef.carryUpToMeanKn
    ) {
      report(
        ['reefs', index, 'carryUpToGustKn'],
        `Reef table: “${reef.name}” is carried up to a gust of ${reef.carryUpToGustKn} kn, under its mean of ${reef.carryUpToMeanKn} kn. A gust is never under the mean.`,
      );
    }
  });
}

function checkPolar(polar: Polar, report: Report): void {
  const ascending = (values: readonly number[]) => values.every((v, i) => i === 0 || v > values[i - 1]!);
  if (!ascending(polar.windSpeedsKn)) {
    report(['polar', 'windSpeedsKn'], 'Polar: the wind speeds must rise from one to the next, none twice.');
  }
  if (!ascending(polar.windAnglesDeg)) {
    report(['polar', 'windAnglesDeg'], 'Polar: the wind angles must rise from one to the next, none twice.');
  }
  if (polar.speedsKn.length !== polar.windSpeedsKn.length) {
    report(
      ['polar', 'speedsKn'],
      `Polar: ${polar.speedsKn.length} rows of boat speed for ${polar.windSpeedsKn.length} wind speeds. Give one row for each wind speed.`,
    );
  }
  polar.speedsKn.forEach((row, index) => {
    if (row.length !== polar.windAnglesDeg.length) {
      report(
        ['polar', 'speedsKn', index],
        `Polar: the row at ${polar.windSpeedsKn[index] ?? '?'} kn has ${row.length} speeds for ${polar.windAnglesDeg.length} wind angles. Fill the holes or take the row out.`,
      );
    }
  });
  if (polar.speedsKn.every((row) => row.every((speed) => speed === 0))) {
    report(['polar', 'speedsKn'], 'Polar: every boat speed is zero, so she never moves.');
  }
}

function checkAngles(boat: Contradicting, report: Report): void {
  const angles = boat.polar.windAnglesDeg;
  const lowest = angles[0];
  const highest = angles[angles.length - 1];
  if (lowest === undefined || highest === undefined) return;
  const { closestAngleDeg: closest, deepestAngleDeg: deepest, leewayDeg } = boat;
  for (const [key, value, what] of [
    ['closestAngleDeg', closest, 'Closest'],
    ['deepestAngleDeg', deepest, 'Deepest'],
  ] as const) {
    if (value !== undefined && (value < lowest || value > highest)) {
      report(
        [key],
        `${what} wind angle: ${value}° is outside the polar, which reaches from ${lowest}° to ${highest}°. Give an angle inside it, or measure the polar further.`,
      );
    }
  }
  if (closest !== undefined && deepest !== undefined && closest >= deepest) {
    report(['deepestAngleDeg'], `Deepest wind angle: ${deepest}° is not over the closest, ${closest}°.`);
  }
  if (
    typeof leewayDeg !== 'number' &&
    leewayDeg.some((row, i) => i > 0 && row.angleDeg <= leewayDeg[i - 1]!.angleDeg)
  ) {
    report(['leewayDeg'], 'Leeway: the wind angles must rise from one row to the next.');
  }
}
