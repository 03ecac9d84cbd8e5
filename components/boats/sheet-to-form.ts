import type { Polar } from '@/lib/polars/polar';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { newSheetForm } from './new-sheet-form';
import type { PolarForm, SheetForm } from './sheet-form';

const text = (value: number | undefined): string => (value === undefined ? '' : String(value));

/** A stored boat sheet as fields to be typed in. */
export function sheetToForm(name: string, sheet: BoatSheet): SheetForm {
  const blank = newSheetForm().sheet;
  const { vaka, ama, pod, pressure, leewayDeg } = sheet;
  return {
    name,
    sheet: {
      spanM: text(sheet.spanM),
      masses: sheet.masses.map(({ label, kg, yM, zM, kind }) => ({
        label,
        kg: text(kg),
        yM: text(yM),
        zM: text(zM),
        kind,
      })),
      hasVaka: vaka !== undefined,
      vaka: { ...blank.vaka, ...texts(vaka) },
      hasAma: ama !== undefined,
      ama: { ...blank.ama, ...texts(ama) },
      hasPod: pod !== undefined,
      pod: { ...blank.pod, ...texts(pod) },
      pressureKind: 'coefficient' in pressure ? 'coefficient' : 'rule',
      pressure: { coefficient: '', kgPerM2: '', atKn: '', ...texts(pressure) },
      fromWaterline: sheet.centreOfLateralResistanceM === 0,
      centreOfLateralResistanceM: sheet.centreOfLateralResistanceM === 0 ? '' : text(sheet.centreOfLateralResistanceM),
      gustFactor: text(sheet.gustFactor),
      workingMargin: text(sheet.workingMargin),
      windHeightExponent: text(sheet.windHeightExponent),
      reefs: sheet.reefs.map((reef) => ({
        name: reef.name,
        areaM2: text(reef.areaM2),
        centreHeightM: text(reef.centreHeightM),
        carryUpToMeanKn: text(reef.carryUpToMeanKn),
        carryUpToGustKn: text(reef.carryUpToGustKn),
        speedFactor: text(reef.speedFactor),
      })),
      polar: polarToForm(sheet.polar),
      closestAngleDeg: text(sheet.closestAngleDeg),
      deepestAngleDeg: text(sheet.deepestAngleDeg),
      leewayKind: typeof leewayDeg === 'number' ? 'one' : 'byAngle',
      leewayOne: typeof leewayDeg === 'number' ? text(leewayDeg) : '',
      leewayDeg:
        typeof leewayDeg === 'number'
          ? blank.leewayDeg
          : leewayDeg.map((row) => ({ angleDeg: text(row.angleDeg), leewayDeg: text(row.leewayDeg) })),
      shunt: { seconds: text(sheet.shunt.seconds), driftKn: text(sheet.shunt.driftKn) },
      notes: sheet.notes,
    },
  };
}

export function polarToForm(polar: Polar): PolarForm {
  return {
    windSpeedsKn: polar.windSpeedsKn.map(String),
    windAnglesDeg: polar.windAnglesDeg.map(String),
    speedsKn: polar.speedsKn.map((row) => row.map(String)),
  };
}

function texts<Numbers extends object>(numbers: Numbers | undefined): Record<string, string> {
  return Object.fromEntries(
    Object.entries(numbers ?? {}).map(([key, value]) => [key, text(value as number | undefined)]),
  );
}
