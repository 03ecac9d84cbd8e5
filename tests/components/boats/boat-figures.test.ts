import { describe, expect, it } from 'vitest';
import { boatFigures } from '@/components/boats/boat-figures';
import { sheetFindings } from '@/components/boats/sheet-findings';
import { limitKn } from '@/components/boats/show';
import { workingHolds } from '@/components/boats/working-holds';
import { workingRighting } from '@/components/boats/working-righting';
import { aBoatSheet } from '../../builders/boat-sheet';

const titles = (changes: Parameters<typeof aBoatSheet>[0]) =>
  sheetFindings(boatFigures(aBoatSheet(changes))).map(({ title }) => title);
const measures = {
  vaka: { waterplaneLengthM: 7, waterplaneBeamM: 0.6, buoyancyHeightM: -0.1 },
  ama: { waterplaneM2: 1.1, volumeL: 200 },
};

describe('boatFigures', () => {
  it('sums by hand', () => {
    const { sums, amaLoadKg } = boatFigures(aBoatSheet());
    // 80 · 3 + 75 · 1.2 = 330; 200 · 0.3 + 80 · 0.1 + 75 · 0.6 = 113; over a span of 3 m.
    expect([sums.massKg, sums.momentYKgM, amaLoadKg]).toEqual([355, 330, 110]);
    expect(sums.momentZKgM).toBeCloseTo(113, 9);
  });

  it('holds at each point of sail no less than at the worst', () => {
    for (const { holds, byPoint } of boatFigures(aBoatSheet()).reefs) {
      const known = Object.values(byPoint).filter((kn) => kn !== null);
      expect(Math.min(...known)).toBe(holds.worstKn);
    }
  });

  it('says where she does not sail a point', () => {
    const [full] = boatFigures(aBoatSheet({ closestAngleDeg: 75, deepestAngleDeg: 130 })).reefs;
    expect([full!.byPoint.close, full!.byPoint.deep]).toEqual([null, null]);
  });
});

describe('sheetFindings', () => {
  it('is clean where all is measured and nothing is carried too far', () => {
    expect(titles(measures)).toEqual([]);
  });

  it('names the reef that is carried further than it holds, by mean or by gust', () => {
    const { holds } = boatFigures(aBoatSheet()).reefs[0]!;
    const reef = { name: 'Full sail', areaM2: 16, centreHeightM: 3 };
    const over = holds.worstKn + 0.1;
    const title = '“Full sail”: carry up to is over holds up to';
    expect(titles({ ...measures, reefs: [{ ...reef, carryUpToMeanKn: over }] })).toEqual([title]);
    expect(titles({ ...measures, reefs: [{ ...reef, carryUpToGustKn: over * 1.35 }] })).toEqual([title]);
    expect(titles({ ...measures, reefs: [{ ...reef, carryUpToMeanKn: holds.worstKn - 0.1 }] })).toEqual([]);
  });

  it('says plainly that there is no reserve aback', () => {
    expect(titles({ ...measures, ama: { waterplaneM2: 1.1, volumeL: 40 } })).toEqual(['She has no reserve aback']);
  });

  it('warns of a shed’s rule with a gust factor on top, and not without one', () => {
    const rule = { ...measures, pressure: { kgPerM2: 10, atKn: 18 } };
    expect(titles(rule)).toEqual(['The pressure rule may hold gusts already']);
    expect(titles({ ...rule, gustFactor: 1 })).toEqual([]);
  });

  it('says what to measure for the curve', () => {
    const [finding] = sheetFindings(boatFigures(aBoatSheet()));
    expect(finding!.text).toContain('the vaka’s waterline length and beam and the ama’s waterplane area');
  });
});

describe('working', () => {
  it('puts every mass into the sum', () => {
    const step = workingRighting(boatFigures(aBoatSheet())).find(({ what }) => what.includes('Sy'))!;
    expect(step.numbers).toBe('200 kg × 0 m + 80 kg × 3 m + 75 kg × 1.2 m');
    expect(step.result).toBe('330 kg·m');
  });

  it('closes the balance that holds up to solves', () => {
    const figures = boatFigures(aBoatSheet());
    const balance = workingHolds(figures, figures.reefs[0]!).at(-1)!;
    const [, withMargin, righting] = /= ([\d,]+) N·m against ([\d,]+) N·m/.exec(balance.numbers)!;
    expect(withMargin).toBe(righting);
  });
});

describe('limitKn', () => {
  it('cuts and never rounds up, and says where its search ends', () => {
    expect([limitKn(12.69), limitKn(12.6), limitKn(120)]).toEqual(['12.6 kn', '12.6 kn', 'over 120 kn']);
  });
});
