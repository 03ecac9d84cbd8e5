import { describe, expect, it } from 'vitest';
import { holdsUpToKn } from '@/lib/rigging/holds-up-to';
import { pressureCoefficient } from '@/lib/rigging/pressure';
import { buildCraft, buildReef } from '../builders/craft';
import published from './hull-lift.json';

const KG_PER_LB = 0.45359237;
const M_PER_FT = 0.3048;
const { kgPerM2 } = published;

it(`${published.coefficient.title}: ${published.coefficient.source}`, () => {
  const { k, expected, tolerance } = published.coefficient;
  expect(Math.abs(pressureCoefficient({ kgPerM2, atKn: k }) - expected)).toBeLessThan(tolerance);
});

describe('wind that lifts the windward hull of a multihull', () => {
  it.each(published.lifts)('$id $title: $source ($provenance)', (row) => {
    // Half the beam is the lever of a catamaran's whole weight.
    const beamM = row.beamFt * M_PER_FT;
    const craft = buildCraft({
      spanM: beamM,
      masses: [{ label: 'all of her', kg: row.weightLb * KG_PER_LB, yM: beamM / 2, zM: 0 }],
      pressure: { kgPerM2, atKn: row.k },
      centreOfLateralResistanceM: 0,
      gustFactor: 1,
      workingMargin: 1,
    });
    const reef = buildReef({ areaM2: row.sailFt2 * M_PER_FT ** 2, centreHeightM: row.centreFt * M_PER_FT });
    const { worstKn } = holdsUpToKn(craft, reef, () => 0, [90]);
    expect(Math.abs(worstKn - row.kn)).toBeLessThan(row.tolerance);
  });
});
