import { readNumber, readOptionalNumber } from '@/components/passages/read-number';
import type { BoatSheetInput } from '@/lib/schemas/boat-sheet';
import type { SheetForm } from './sheet-form';

/**
 * What was typed as the schema takes it. A number that is missing or cannot be read becomes NaN, which the schema
 * answers with a message at the field; an optional one that is empty is left out. Nothing becomes zero by itself.
 */
export function formToSheet(form: SheetForm['sheet']): BoatSheetInput {
  return {
    spanM: readNumber(form.spanM),
    masses: form.masses.map(({ label, kind, kg, yM, zM }) => ({
      label,
      kind,
      kg: readNumber(kg),
      yM: readNumber(yM),
      zM: readNumber(zM),
    })),
    ...measures(form),
    pressure:
      form.pressureKind === 'coefficient'
        ? { coefficient: readNumber(form.pressure.coefficient) }
        : { kgPerM2: readNumber(form.pressure.kgPerM2), atKn: readNumber(form.pressure.atKn) },
    centreOfLateralResistanceM: form.fromWaterline ? 0 : readNumber(form.centreOfLateralResistanceM),
    gustFactor: readNumber(form.gustFactor),
    workingMargin: readNumber(form.workingMargin),
    windHeightExponent: readNumber(form.windHeightExponent),
    reefs: form.reefs.map((reef) => ({
      name: reef.name,
      areaM2: readNumber(reef.areaM2),
      centreHeightM: readNumber(reef.centreHeightM),
      carryUpToMeanKn: readOptionalNumber(reef.carryUpToMeanKn),
      carryUpToGustKn: readOptionalNumber(reef.carryUpToGustKn),
      speedFactor: readNumber(reef.speedFactor),
    })),
    polar: {
      windSpeedsKn: form.polar.windSpeedsKn.map(readNumber),
      windAnglesDeg: form.polar.windAnglesDeg.map(readNumber),
      speedsKn: form.polar.speedsKn.map((row) => row.map(readNumber)),
    },
    closestAngleDeg: readOptionalNumber(form.closestAngleDeg),
    deepestAngleDeg: readOptionalNumber(form.deepestAngleDeg),
    leewayDeg:
      form.leewayKind === 'one'
        ? readNumber(form.leewayOne)
        : form.leewayDeg.map((row) => ({ angleDeg: readNumber(row.angleDeg), leewayDeg: readNumber(row.leewayDeg) })),
    shunt: { seconds: readNumber(form.shunt.seconds), driftKn: readNumber(form.shunt.driftKn) },
    notes: form.notes,
  };
}

/** The groups that are switched on. */
function measures({ hasVaka, vaka, hasAma, ama, hasPod, pod }: SheetForm['sheet']): Partial<BoatSheetInput> {
  return {
    ...(hasVaka && {
      vaka: {
        waterplaneLengthM: readNumber(vaka.waterplaneLengthM),
        waterplaneBeamM: readNumber(vaka.waterplaneBeamM),
        waterplaneAreaM2: readOptionalNumber(vaka.waterplaneAreaM2),
        buoyancyHeightM: readNumber(vaka.buoyancyHeightM),
      },
    }),
    ...(hasAma && {
      ama: { volumeL: readOptionalNumber(ama.volumeL), waterplaneM2: readOptionalNumber(ama.waterplaneM2) },
    }),
    ...(hasPod && {
      pod: {
        lengthM: readNumber(pod.lengthM),
        breadthM: readNumber(pod.breadthM),
        depthM: readNumber(pod.depthM),
        offsetM: readNumber(pod.offsetM),
        bottomHeightM: readNumber(pod.bottomHeightM),
      },
    }),
  };
}
