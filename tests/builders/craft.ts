import type { Craft, Reef } from '@/lib/rigging/craft';

/** An invented craft of 7.2 m with every measure; tests change what they are about. */
export function buildCraft(changes: Partial<Craft> = {}): Craft {
  return {
    spanM: 2.9,
    masses: [
      { label: 'ama', kg: 62, yM: 2.9, zM: 0.1 },
      { label: 'akas', kg: 34, yM: 1.45, zM: 0.45 },
      { label: 'vaka', kg: 195, yM: 0, zM: 0.22 },
      { label: 'rig', kg: 38, yM: 0, zM: 2.7 },
      { label: 'crew on the akas', kg: 75, yM: 1.2, zM: 0.65 },
      { label: 'crew inside', kg: 70, yM: 0.1, zM: 0.5 },
    ],
    vaka: { waterplaneLengthM: 7.2, waterplaneBeamM: 0.55, buoyancyHeightM: -0.12 },
    ama: { volumeL: 180, waterplaneM2: 1.1 },
    pod: { lengthM: 2.2, breadthM: 0.6, depthM: 0.3, offsetM: 0.9, bottomHeightM: 0.35 },
    pressure: { coefficient: 1.4 },
    centreOfLateralResistanceM: -0.45,
    gustFactor: 1.35,
    workingMargin: 1.5,
    windHeightExponent: 0,
    reefs: [buildReef()],
    ...changes,
  };
}

export function buildReef(changes: Partial<Reef> = {}): Reef {
  return { name: 'full', areaM2: 15.2, centreHeightM: 3, speedFactor: 1, ...changes };
}

/** The craft without one of her optional parts. */
export function without(craft: Craft, part: 'vaka' | 'ama' | 'pod'): Craft {
  const { [part]: _left, ...rest } = craft;
  return rest;
}
