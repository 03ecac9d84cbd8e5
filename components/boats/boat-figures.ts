import { prepareBoat, type PreparedBoat } from '@/lib/passages/prepared-boat';
import { reefHolds } from '@/lib/passages/reef-holds';
import { abackRightingMomentNm } from '@/lib/rigging/aback';
import { amaLoadAtRestKg } from '@/lib/rigging/ama-load';
import type { HoldsUpTo } from '@/lib/rigging/holds-up-to';
import { sumMasses, type MassSums } from '@/lib/rigging/sum-masses';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { Kilograms, Knots, NewtonMetres } from '@/lib/units/quantities';
import { POINTS_OF_SAIL, type PointOfSail } from './points-of-sail';

type Reef = BoatSheet['reefs'][number];

export interface ReefFigures {
  readonly reef: Reef;
  readonly holds: HoldsUpTo;
  /** Least of each point of sail; null where she does not sail it. */
  readonly byPoint: Readonly<Record<PointOfSail, Knots | null>>;
  /** Null: not known. */
  readonly abackLimitKn: Knots | null;
  /** The owner's carry-up-to is over what is computed. */
  readonly carriedTooFar: boolean;
}

/** Everything that the boat sheet says of her in numbers. */
export interface BoatFigures {
  readonly sheet: BoatSheet;
  readonly sums: MassSums;
  readonly prepared: PreparedBoat;
  readonly amaLoadKg: Kilograms;
  readonly abackRightingNm: NewtonMetres | null;
  readonly reefs: readonly ReefFigures[];
}

/** Works a boat sheet. Pure: the same on the server and while typing. */
export function boatFigures(sheet: BoatSheet): BoatFigures {
  const sums = sumMasses(sheet.masses);
  const prepared = prepareBoat(sheet);
  return {
    sheet,
    sums,
    prepared,
    amaLoadKg: amaLoadAtRestKg(sums, sheet.spanM),
    abackRightingNm: abackRightingMomentNm(sheet),
    reefs: sheet.reefs.map((reef, index) => reefFigures(sheet, reef, prepared.abackLimitsKn[index] ?? null)),
  };
}

function reefFigures(sheet: BoatSheet, reef: Reef, abackLimitKn: Knots | null): ReefFigures {
  const holds = reefHolds(sheet, reef);
  const byPoint = Object.fromEntries(
    POINTS_OF_SAIL.map(({ point, includes }) => {
      const knots = holds.byAngle.filter(({ angleDeg }) => includes(angleDeg)).map(({ kn }) => kn);
      return [point, knots.length > 0 ? Math.min(...knots) : null];
    }),
  ) as Record<PointOfSail, Knots | null>;
  return { reef, holds, byPoint, abackLimitKn, carriedTooFar: isCarriedTooFar(sheet, reef, holds.worstKn) };
}

/** A carry-up-to in gusts is held against the gust that belongs to the mean. */
function isCarriedTooFar(sheet: BoatSheet, reef: Reef, holdsKn: Knots): boolean {
  return (reef.carryUpToMeanKn ?? 0) > holdsKn || (reef.carryUpToGustKn ?? 0) > holdsKn * sheet.gustFactor;
}
