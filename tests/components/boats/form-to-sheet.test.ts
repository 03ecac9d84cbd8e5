import { describe, expect, it } from 'vitest';
import { formToSheet } from '@/components/boats/form-to-sheet';
import { newSheetForm } from '@/components/boats/new-sheet-form';
import { sheetToForm } from '@/components/boats/sheet-to-form';
import { boatSheetSchema } from '@/lib/schemas/boat-sheet';
import { demoBoatSheet } from '@/seeds/demo/boat';
import { secondBoatSheet } from '@/seeds/demo/second-boat';
import { aBoatSheet } from '../../builders/boat-sheet';

const thereAndBack = (sheet: ReturnType<typeof aBoatSheet>) =>
  boatSheetSchema.parse(formToSheet(sheetToForm('x', sheet).sheet));

describe('formToSheet', () => {
  it.each([
    ['every measure', boatSheetSchema.parse(demoBoatSheet)],
    ['a shed’s rule and no measures', boatSheetSchema.parse(secondBoatSheet)],
    ['levers from the waterline', aBoatSheet({ centreOfLateralResistanceM: 0 })],
    [
      'leeway by angle',
      aBoatSheet({
        leewayDeg: [
          { angleDeg: 60, leewayDeg: 8 },
          { angleDeg: 120, leewayDeg: 2 },
        ],
      }),
    ],
  ])('gives a sheet with %s back as it was', (_what, sheet) => {
    expect(thereAndBack(sheet)).toEqual(sheet);
  });

  it('never makes zero of an empty field', () => {
    const sheet = formToSheet(newSheetForm().sheet);
    expect(sheet.spanM).toBeNaN();
    expect(sheet.masses[1]!.kg).toBeNaN();
    expect(sheet.reefs[0]!.carryUpToMeanKn).toBeUndefined();
    expect(sheet.polar.speedsKn[0]![0]).toBeNaN();
    expect(sheet.centreOfLateralResistanceM).toBeNaN();
  });

  it('takes a comma for the point, and refuses to guess at the rest', () => {
    const { sheet } = sheetToForm('x', aBoatSheet());
    expect(formToSheet({ ...sheet, spanM: '3,05' }).spanM).toBe(3.05);
    expect(formToSheet({ ...sheet, spanM: '3.05 m' }).spanM).toBeNaN();
    expect(formToSheet({ ...sheet, closestAngleDeg: 'sixty' }).closestAngleDeg).toBeNaN();
  });

  it('leaves measures out that are switched off, and keeps them in the form', () => {
    const { sheet } = sheetToForm('x', boatSheetSchema.parse(demoBoatSheet));
    const off = { ...sheet, hasVaka: false, hasPod: false };
    expect(formToSheet(off)).not.toHaveProperty('vaka');
    expect(formToSheet(off)).not.toHaveProperty('pod');
    expect(off.vaka.waterplaneLengthM).toBe('7');
  });
});
