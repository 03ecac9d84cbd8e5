interface IssueSink {
  addIssue(issue: { code: 'custom'; path: (string | number)[]; message: string }): void;
}

/** About one metre, in degrees of latitude: closer waypoints are one spot. */
const SAME_SPOT_DEG = 1e-5;

export function findRouteContradictions(
  route: readonly { readonly name: string; readonly lat: number; readonly lon: number }[],
  context: IssueSink,
): void {
  route.forEach((waypoint, index) => {
    const before = route[index - 1];
    if (!before) return;
    const sameSpot =
      Math.abs(waypoint.lat - before.lat) < SAME_SPOT_DEG && Math.abs(waypoint.lon - before.lon) < SAME_SPOT_DEG;
    if (sameSpot) {
      context.addIssue({
        code: 'custom',
        path: [index],
        message: `Waypoints ${index} and ${index + 1} (“${before.name}” and “${waypoint.name}”) are on one spot. Move one or take it out.`,
      });
    }
  });
}

export function findWindContradictions(
  rows: readonly { readonly time: string; readonly meanKn: number; readonly gustKn?: number | undefined }[],
  context: IssueSink,
): void {
  findTimeContradictions('Wind', rows, context);
  rows.forEach((row, index) => {
    if (row.gustKn !== undefined && row.gustKn < row.meanKn) {
      context.addIssue({
        code: 'custom',
        path: [index, 'gustKn'],
        message: `Wind row ${index + 1}: a gust of ${row.gustKn} kn is under the mean of ${row.meanKn} kn. Give the gust at or over the mean, or leave it empty.`,
      });
    }
  });
}

export function findStreamContradictions(rows: readonly { readonly time: string }[], context: IssueSink): void {
  findTimeContradictions('Stream', rows, context);
}

function findTimeContradictions(what: string, rows: readonly { readonly time: string }[], context: IssueSink): void {
  rows.forEach((row, index) => {
    const before = rows[index - 1];
    if (before && Date.parse(row.time) <= Date.parse(before.time)) {
      context.addIssue({
        code: 'custom',
        path: [index, 'time'],
        message: `${what} row ${index + 1}: its time is not after the row before. List the rows in order of time, none twice.`,
      });
    }
  });
}
