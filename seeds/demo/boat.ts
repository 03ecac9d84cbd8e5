import type { BoatSheetInput } from '@/lib/schemas/boat-sheet';

export const demoBoatName = 'Saltwren';

/** An invented 7.4 m craft with one sail, two people aboard. No boat of these numbers is known. */
export const demoBoatSheet: BoatSheetInput = {
  spanM: 3.05,
  masses: [
    { label: 'Vaka with deck and cuddy', kg: 158, yM: 0, zM: 0.22, kind: 'structure' },
    { label: 'Ama', kg: 70, yM: 3.05, zM: 0.12, kind: 'structure' },
    { label: 'Two akas and the net', kg: 42, yM: 1.5, zM: 0.48, kind: 'structure' },
    { label: 'Lee pod', kg: 16, yM: -0.85, zM: 0.5, kind: 'structure' },
    { label: 'Mast, yard and sail', kg: 36, yM: 0, zM: 2.6, kind: 'rig' },
    { label: 'Water, anchor and stores', kg: 28, yM: 0.1, zM: 0.15, kind: 'stores' },
    { label: 'Helm, on the net', kg: 74, yM: 1.6, zM: 0.7, kind: 'crew' },
    { label: 'Crew, on the net', kg: 68, yM: 0.6, zM: 0.6, kind: 'crew' },
  ],
  vaka: { waterplaneLengthM: 7.0, waterplaneBeamM: 0.58, buoyancyHeightM: -0.13 },
  ama: { volumeL: 190, waterplaneM2: 1.15 },
  pod: { lengthM: 2.1, breadthM: 0.55, depthM: 0.3, offsetM: 0.88, bottomHeightM: 0.36 },
  pressure: { coefficient: 1.4 },
  centreOfLateralResistanceM: -0.4,
  gustFactor: 1.35,
  workingMargin: 1.5,
  windHeightExponent: 0,
  reefs: [
    { name: 'Full sail', areaM2: 18, centreHeightM: 3.25, carryUpToMeanKn: 8, speedFactor: 1 },
    { name: 'One panel in', areaM2: 14.6, centreHeightM: 2.85, carryUpToMeanKn: 10, speedFactor: 0.95 },
    { name: 'Two panels in', areaM2: 11.4, centreHeightM: 2.45, carryUpToMeanKn: 14, speedFactor: 0.88 },
    {
      name: 'Three panels in',
      areaM2: 8.4,
      centreHeightM: 2.1,
      carryUpToMeanKn: 16,
      carryUpToGustKn: 22,
      speedFactor: 0.78,
    },
  ],
  polar: {
    windSpeedsKn: [4, 8, 12, 16, 20, 26],
    windAnglesDeg: [60, 75, 90, 110, 130, 145, 160],
    speedsKn: [
      [2.1, 2.6, 2.8, 2.9, 2.5, 2.1, 1.7],
      [3.7, 4.4, 4.8, 5.0, 4.5, 3.9, 3.3],
      [4.6, 5.4, 6.0, 6.4, 5.9, 5.2, 4.5],
      [5.0, 6.0, 6.8, 7.4, 7.0, 6.2, 5.4],
      [5.1, 6.2, 7.2, 8.1, 7.8, 7.0, 6.1],
      [4.8, 6.0, 7.2, 8.5, 8.4, 7.6, 6.7],
    ],
  },
  closestAngleDeg: 60,
  deepestAngleDeg: 145,
  leewayDeg: 5,
  shunt: { seconds: 50, driftKn: 0.8 },
  notes: 'Weighed in parts on a bathroom scale in spring. The pod was fitted after that and is measured.',
};
