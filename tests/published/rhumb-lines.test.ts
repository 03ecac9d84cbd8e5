import { describe, expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { rhumbDirect, rhumbInverse } from '@/lib/geo/rhumb';
import { METRES_PER_NMI, RAD_PER_DEG } from '@/lib/units/constants';
import published from './rhumb-lines.json';

interface Ends {
  readonly fromLat: number;
  readonly fromLon: number;
  readonly toLat: number;
  readonly toLon: number;
}

const inverseOf = (ends: Ends) =>
  rhumbInverse({ lat: ends.fromLat, lon: ends.fromLon }, { lat: ends.toLat, lon: ends.toLon });

describe(`rhumb lines: ${published.inverse.source}`, () => {
  it.each(published.inverse.legs)('from $fromLat $fromLon to $toLat $toLon', (leg) => {
    const { courseDeg, distanceM } = inverseOf(leg);
    expect(Math.abs(signedDeg(courseDeg - leg.courseDeg))).toBeLessThan(published.inverse.tolerance.courseDeg);
    expect(Math.abs(distanceM - leg.distanceM)).toBeLessThan(published.inverse.tolerance.distanceM);
  });

  it.each(published.direct.lines)('from $fromLat $fromLon on $courseDeg° for $distanceM m', (line) => {
    const to = rhumbDirect({ lat: line.fromLat, lon: line.fromLon }, line.courseDeg, line.distanceM);
    expect(Math.abs(to.lat - line.toLat)).toBeLessThan(published.direct.toleranceDeg);
    expect(Math.abs(to.lon - line.toLon)).toBeLessThan(published.direct.toleranceDeg);
  });
});

describe(`rhumb lines: ${published.manualInverse.source}`, () => {
  it(published.manualInverse.title, () => {
    const { courseDeg, distanceM } = inverseOf(published.manualInverse);
    expect(Math.abs(courseDeg - published.manualInverse.courseDeg)).toBeLessThan(2e-5);
    expect(Math.abs(distanceM - published.manualInverse.distanceM)).toBeLessThan(1);
  });

  it(published.manualDirect.title, () => {
    const line = published.manualDirect;
    const to = rhumbDirect({ lat: line.fromLat, lon: line.fromLon }, line.courseDeg, line.distanceM);
    expect(Math.abs(to.lat - line.toLat)).toBeLessThan(line.toleranceDeg);
    expect(Math.abs(to.lon - line.toLon)).toBeLessThan(line.toleranceDeg);
  });
});

describe('Mercator sailing of handbooks, whose mile is a minute of latitude and not 1852 m', () => {
  it.each(published.handbook)('$id $title ($provenance)', (row) => {
    const { courseDeg, distanceM } = inverseOf(row);
    expect(Math.abs(courseDeg - row.courseDeg)).toBeLessThan(row.tolerance.courseDeg);

    const minutesOfLatitude = (row.toLat - row.fromLat) * 60;
    const handbookMiles = minutesOfLatitude / Math.cos(courseDeg * RAD_PER_DEG);
    expect(Math.abs(handbookMiles - row.handbookMiles)).toBeLessThan(row.tolerance.handbookMiles);

    const nmi = distanceM / METRES_PER_NMI;
    expect(Math.abs(nmi - row.wgs84Nmi)).toBeLessThan(0.005);
    expect(nmi).toBeLessThan(row.handbookMiles - 0.5);
  });

  it(`${published.coastal.id} ${published.coastal.title} (${published.coastal.provenance})`, () => {
    const row = published.coastal;
    const { courseDeg, distanceM } = inverseOf(row);
    expect(Math.abs(courseDeg - row.courseDeg)).toBeLessThan(row.tolerance.courseDeg);
    expect(Math.abs(distanceM - row.distanceM)).toBeLessThan(row.tolerance.distanceM);
    expect(Math.abs(distanceM / METRES_PER_NMI - row.nauticalMiles)).toBeLessThan(row.tolerance.nauticalMiles);
  });
});
