import type { BoatSheetInput } from '@/lib/schemas/boat-sheet';

export const secondBoatName = 'Alder Skip';

/** An invented boat under construction: no measures of her hulls yet, so that curve and aback limit are not known. */
export const secondBoatSheet: BoatSheetInput = {
  spanM: 2.4,
  masses: [
    { label: 'Vaka, planked, no deck', kg: 88, yM: 0, zM: 0.2, kind: 'structure' },
    { label: 'Ama', kg: 34, yM: 2.4, zM: 0.1, kind: 'structure' },
    { label: 'Akas', kg: 22, yM: 1.2, zM: 0.4, kind: 'structure' },
    { label: 'Rig, guessed', kg: 24, yM: 0, zM: 2.1, kind: 'rig' },
    { label: 'One aboard', kg: 75, yM: 0.9, zM: 0.55, kind: 'crew' },
  ],
  pressure: { kgPerM2: 10, atKn: 18 },
  centreOfLateralResistanceM: -0.3,
  gustFactor: 1,
  reefs: [
    { name: 'Whole sail', areaM2: 10.5, centreHeightM: 2.6 },
    { name: 'Small sail', areaM2: 6.2, centreHeightM: 2.0, speedFactor: 0.8 },
  ],
  polar: {
    windSpeedsKn: [6, 12, 18],
    windAnglesDeg: [65, 90, 120, 150],
    speedsKn: [
      [2.6, 3.4, 3.3, 2.4],
      [3.9, 5.2, 5.4, 4.2],
      [4.3, 5.9, 6.6, 5.4],
    ],
  },
  closestAngleDeg: 65,
  deepestAngleDeg: 150,
  shunt: { seconds: 75, driftKn: 1 },
  notes: 'Not launched yet. The polar is a guess.',
};
