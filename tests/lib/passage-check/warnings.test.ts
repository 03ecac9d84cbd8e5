import { describe, expect, it } from 'vitest';
import { check, completeRequest } from '../../builders/check-request';

const codesOf = (request: ReturnType<typeof completeRequest>) => check(request).warnings.map((warning) => warning.code);

describe('warnings of the passage and the boat sheet', () => {
  it('names a reef that is carried up to more than it holds, by mean or by gust', () => {
    const request = completeRequest();
    request.boat.reefs[0]!.carryUpToMeanKn = 11;
    const before = check(request).warnings.find((warning) => warning.code === 'carry-above-holds');
    request.boat.reefs[0]!.carryUpToMeanKn = 30;
    const after = check(request).warnings.find((warning) => warning.code === 'carry-above-holds')!;
    expect(after.message).toContain('“full” is carried up to a mean of 30.0 kn, but holds up to');
    expect(after.numbers.holdsUpToKn!).toBeGreaterThan(5);
    expect(after.numbers.holdsUpToKn!).toBeLessThan(30);
    expect(before?.numbers.carryUpToKn ?? 11).toBe(11);

    delete request.boat.reefs[0]!.carryUpToMeanKn;
    expect(codesOf(request)).not.toContain('carry-above-holds');
    request.boat.reefs[0]!.carryUpToGustKn = 60;
    expect(codesOf(request)).toContain('carry-above-holds');
  });

  it('says where a rule that may hold gusts meets a gust factor', () => {
    const request = completeRequest();
    request.boat.pressure = { kgPerM2: 10, atKn: 18 };
    expect(codesOf(request)).toContain('rule-may-hold-gusts');
    request.boat.gustFactor = 1;
    expect(codesOf(request)).not.toContain('rule-may-hold-gusts');
  });

  it('says that no stream was given, and that the forecast has no issue time', () => {
    const request = completeRequest();
    expect(codesOf(request)).toContain('no-stream-given');
    delete request.wind.issuedAt;
    expect(codesOf(request)).toContain('forecast-age-unknown');
  });

  it('holds the hours against the skipper’s limit, also where they are not known', () => {
    const request = completeRequest();
    request.limits = { hours: 3 };
    expect(codesOf(request)).not.toContain('over-hours-limit');
    request.limits = { hours: 1.5 };
    expect(codesOf(request)).toContain('over-hours-limit');
    request.limits = { hours: 3 };
    request.wind.rows[1] = { ...request.wind.rows[1]!, time: '2026-06-01T16:30:00Z' };
    expect(codesOf(request)).toContain('over-hours-limit');
  });
});

describe('flags of a leg', () => {
  const flagsOf = (request: ReturnType<typeof completeRequest>) =>
    check(request).legs.flatMap((leg) => leg.flags.map((flag) => flag.code));

  it('say when it is dark, and hold the limit against it', () => {
    const request = completeRequest();
    request.departure = '2026-06-02T02:30:00Z';
    expect(flagsOf(request)).not.toContain('after-dark');
    request.departure = '2026-06-02T03:30:00Z';
    request.wind.rows[1] = { ...request.wind.rows[1]!, time: '2026-06-03T03:30:00Z' };
    request.asOf = '2026-06-01T20:00:00Z';
    request.limits = { afterDark: false };
    expect(flagsOf(request)).toEqual(expect.arrayContaining(['after-dark', 'over-dark-limit']));
  });

  it('hold mean, gust, load share and shunts against the limits', () => {
    const request = completeRequest();
    request.limits = { meanKn: 9, gustKn: 12, loadShare: 0.3, shuntsPerHour: 0 };
    expect(flagsOf(request)).toEqual(
      expect.arrayContaining(['over-mean-limit', 'over-gust-limit', 'over-load-share-limit', 'over-shunts-limit']),
    );
    request.limits = { meanKn: 10, gustKn: 13, loadShare: 0.6, shuntsPerHour: 1 };
    expect(flagsOf(request).filter((code) => code.startsWith('over-'))).toEqual([]);
  });

  it('count many shunts in an hour', () => {
    const request = completeRequest();
    request.boat.shunt = { seconds: 20, driftKn: 0.5 };
    request.route[1] = { ...request.route[1]!, lat: 48.25, lon: -123.3, corridorHalfWidthM: 300 };
    expect(flagsOf(request)).toContain('many-shunts');
    request.route[1] = { ...request.route[1]!, corridorHalfWidthM: 9000 };
    expect(flagsOf(request)).not.toContain('many-shunts');
  });

  it('warn of deep angles near the aback limit, or where that is not known', () => {
    const request = completeRequest();
    // Straight down the wind: boards at the deepest angle, 150°.
    request.route[1] = { ...request.route[1]!, lat: 48.35, lon: -123.3 };
    request.wind.rows.forEach((row) => Object.assign(row, { meanKn: 15, gustKn: 20 }));
    expect(flagsOf(request)).toContain('deep-near-aback-limit');
    delete request.boat.ama!.volumeL;
    expect(flagsOf(request)).toContain('aback-not-known');
    expect(flagsOf(request)).not.toContain('deep-near-aback-limit');
  });

  it('say that land was not checked where there is no chart', () => {
    expect(flagsOf(completeRequest())).toContain('land-not-checked');
  });
});
