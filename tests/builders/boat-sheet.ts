import { type BoatSheet, type BoatSheetInput, boatSheetSchema } from '@/lib/schemas/boat-sheet';

/** An invented boat of round numbers, valid as it stands. */
export function aBoatSheet(changes: Partial<BoatSheetInput> = {}): BoatSheet {
  return boatSheetSchema.parse({
    spanM: 3,
    masses: [
      { label: 'Vaka', kg: 200, yM: 0, zM: 0.3, kind: 'structure' },
      { label: 'Ama', kg: 80, yM: 3, zM: 0.1, kind: 'structure' },
      { label: 'Helm', kg: 75, yM: 1.2, zM: 0.6, kind: 'crew' },
    ],
    pressure: { coefficient: 1.4 },
    centreOfLateralResistanceM: -0.4,
    reefs: [
      { name: 'Full sail', areaM2: 16, centreHeightM: 3 },
      { name: 'Reefed', areaM2: 8, centreHeightM: 2 },
    ],
    polar: {
      windSpeedsKn: [5, 20],
      windAnglesDeg: [50, 90, 150],
      speedsKn: [
        [3, 4, 3],
        [6, 8, 7],
      ],
    },
    closestAngleDeg: 55,
    deepestAngleDeg: 150,
    shunt: { seconds: 60, driftKn: 0.8 },
    ...changes,
  });
}
