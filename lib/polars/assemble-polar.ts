import type { Polar } from '@/lib/polars/polar';
import type { PolarFinding } from '@/lib/polars/polar-finding';
import type { PolarCell } from '@/lib/polars/read-polar-lines';

/** A table from its cells in any order; doubles and holes are findings. */
export function assemblePolar(
  cells: readonly PolarCell[],
): { readonly polar: Polar } | { readonly findings: readonly PolarFinding[] } {
  const windSpeedsKn = ascending(cells.map((cell) => cell.windKn));
  const windAnglesDeg = ascending(cells.map((cell) => cell.angleDeg));
  if (windSpeedsKn.length === 0) return { findings: [{ line: 1, message: 'There are no lines under the header.' }] };
  if (windAnglesDeg.length < 2) {
    return { findings: [{ line: cells[0]!.line, message: 'A polar needs at least two wind angles.' }] };
  }

  const found = new Map<string, PolarCell>();
  const findings: PolarFinding[] = [];
  for (const cell of cells) {
    const key = `${cell.windKn}/${cell.angleDeg}`;
    const earlier = found.get(key);
    if (earlier) {
      const where = `${cell.windKn} kn at ${cell.angleDeg}°`;
      findings.push({
        line: cell.line,
        message: `Line ${cell.line}: ${where} was given in line ${earlier.line} already. Keep one of them.`,
      });
    } else found.set(key, cell);
  }

  const speedsKn = windSpeedsKn.map((windKn) =>
    windAnglesDeg.map((angleDeg) => {
      const cell = found.get(`${windKn}/${angleDeg}`);
      if (cell) return cell.speedKn;
      const message = `No boat speed for ${windKn} kn at ${angleDeg}°. Every wind needs every angle: fill it in, or take that wind or angle out.`;
      findings.push({ line: cells.find((other) => other.windKn === windKn)!.line, column: 'boat_speed_kn', message });
      return Number.NaN;
    }),
  );
  return findings.length > 0 ? { findings } : { polar: { windSpeedsKn, windAnglesDeg, speedsKn } };
}

function ascending(values: readonly number[]): number[] {
  return [...new Set(values)].sort((a, b) => a - b);
}
