import { z } from 'zod';
import { nameField, numberField } from '@/lib/schemas/number-field';
import { findBoatContradictions } from '@/lib/schemas/boat-contradictions';

export const massSchema = z.object({
  label: nameField('Mass label'),
  kg: numberField({ what: 'Mass', unit: 'kg', min: 0, max: 5000 }),
  yM: numberField({ what: 'y, from the vaka toward the ama', unit: 'm', min: -10, max: 15 }),
  zM: numberField({ what: 'z, up from the waterline', unit: 'm', min: -3, max: 15 }),
});

export const vakaSchema = z.object({
  waterplaneLengthM: numberField({ what: 'Vaka waterplane length', unit: 'm', min: 1, max: 25 }),
  waterplaneBeamM: numberField({ what: 'Vaka waterplane beam', unit: 'm', min: 0.1, max: 4 }),
  waterplaneAreaM2: numberField({ what: 'Vaka waterplane area', unit: 'm²', min: 0.1, max: 60 }).optional(),
  buoyancyHeightM: numberField({
    what: "Height of the vaka's centre of buoyancy",
    unit: 'm',
    min: -2,
    max: 0,
    hintOver: 'It lies under the waterline: write it as zero or a negative number of metres.',
  }),
});

export const amaSchema = z.object({
  volumeL: numberField({ what: 'Ama volume', unit: 'litres', min: 5, max: 5000 }).optional(),
  waterplaneM2: numberField({ what: 'Ama waterplane area', unit: 'm²', min: 0.05, max: 15 }).optional(),
});

export const podSchema = z.object({
  lengthM: numberField({ what: 'Pod length', unit: 'm', min: 0.1, max: 10 }),
  breadthM: numberField({ what: 'Pod breadth', unit: 'm', min: 0.05, max: 4 }),
  depthM: numberField({ what: 'Pod depth', unit: 'm', min: 0.02, max: 2 }),
  offsetM: numberField({
    what: 'Pod offset to leeward',
    unit: 'm',
    min: 0.05,
    max: 6,
    hintUnder: 'Give the distance to leeward of the vaka’s centreline as a positive number of metres.',
  }),
  bottomHeightM: numberField({ what: 'Height of the pod’s bottom', unit: 'm', min: 0, max: 3 }),
});

export const pressureSchema = z.union(
  [
    z.strictObject({ coefficient: numberField({ what: 'Sail coefficient C', unit: '', min: 0.3, max: 4 }) }),
    z.strictObject({
      kgPerM2: numberField({ what: 'Pressure rule', unit: 'kg/m²', min: 0.2, max: 100 }),
      atKn: numberField({ what: 'Wind of the pressure rule', unit: 'kn', min: 2, max: 80 }),
    }),
  ],
  {
    error:
      'Pressure: give either a coefficient, or a rule of kgPerM2 at atKn, and not both. For example {"coefficient": 1.4}.',
  },
);

export const reefSchema = z.object({
  name: nameField('Reef name', 60),
  areaM2: numberField({ what: 'Sail area', unit: 'm²', min: 0.2, max: 150 }),
  centreHeightM: numberField({ what: 'Height of the centre of effort', unit: 'm', min: 0.1, max: 20 }),
  carryUpToMeanKn: numberField({ what: 'Carry up to, mean', unit: 'kn', min: 1, max: 80 }).optional(),
  carryUpToGustKn: numberField({ what: 'Carry up to, gust', unit: 'kn', min: 1, max: 100 }).optional(),
  speedFactor: numberField({ what: 'Speed factor', unit: '', min: 0.05, max: 1.5 }).default(1),
});

const polarCell = z
  .number({ error: 'Polar: this cell is empty or not a number. Fill it in or take its row or column out.' })
  .min(0, { error: 'Polar: a boat speed cannot be negative.' })
  .max(40, { error: 'Polar: a boat speed over 40 kn is out of range. Check the unit: knots.' });

export const polarSchema = z.object({
  windSpeedsKn: z
    .array(numberField({ what: 'Polar wind speed', unit: 'kn', min: 0.5, max: 80 }))
    .min(1, { error: 'Polar: give at least one wind speed.' })
    .max(60),
  windAnglesDeg: z
    .array(numberField({ what: 'Polar wind angle', unit: '°', min: 0, max: 180 }))
    .min(2, { error: 'Polar: give at least two wind angles.' })
    .max(181),
  speedsKn: z.array(z.array(polarCell)),
});

export const leewaySchema = z.union(
  [
    numberField({ what: 'Leeway', unit: '°', min: 0, max: 40 }),
    z
      .array(
        z.object({
          angleDeg: numberField({ what: 'Wind angle of the leeway', unit: '°', min: 0, max: 180 }),
          leewayDeg: numberField({ what: 'Leeway', unit: '°', min: 0, max: 40 }),
        }),
      )
      .min(1)
      .max(60),
  ],
  { error: 'Leeway: give degrees, or a list of {angleDeg, leewayDeg}.' },
);

export const shuntSchema = z.object({
  seconds: numberField({ what: 'Time of a shunt', unit: 's', min: 0, max: 1800 }),
  driftKn: numberField({ what: 'Drift in a shunt', unit: 'kn', min: 0, max: 6 }),
});

/** Fields of a boat before the checks that need several of them together. */
export const boatFields = {
  spanM: numberField({
    what: 'Span between the centrelines of vaka and ama',
    unit: 'm',
    min: 0.3,
    max: 15,
    hintUnder: 'The ama is to windward, so the span is a positive number of metres.',
  }),
  masses: z.array(massSchema).min(1, { error: 'Masses: give at least one item.' }).max(200),
  vaka: vakaSchema.optional(),
  ama: amaSchema.optional(),
  pod: podSchema.optional(),
  pressure: pressureSchema,
  centreOfLateralResistanceM: numberField({
    what: 'Centre of lateral resistance',
    unit: 'm',
    min: -4,
    max: 0,
    hintOver: 'It lies under the waterline: write it as zero or a negative number of metres.',
  }),
  gustFactor: numberField({
    what: 'Gust factor',
    unit: '',
    min: 1,
    max: 3,
    hintUnder: 'A gust is never under the mean: give 1 or more.',
  }).default(1.35),
  workingMargin: numberField({
    what: 'Working margin',
    unit: '',
    min: 1,
    max: 5,
    hintUnder: 'Under 1 the reef would be called after she has gone over: give 1 or more.',
  }).default(1.5),
  windHeightExponent: numberField({ what: 'Wind height exponent', unit: '', min: 0, max: 0.4 }).default(0),
  reefs: z
    .array(reefSchema)
    .min(1, { error: 'Reef table: give at least the full sail.' })
    .max(20, { error: 'Reef table: at most 20 rows.' }),
  polar: polarSchema,
  closestAngleDeg: numberField({ what: 'Closest wind angle', unit: '°', min: 1, max: 179 }).optional(),
  deepestAngleDeg: numberField({ what: 'Deepest wind angle', unit: '°', min: 1, max: 179 }).optional(),
  leewayDeg: leewaySchema.default(0),
  shunt: shuntSchema,
} as const;

export const boatSchema = z.object(boatFields).superRefine(findBoatContradictions);
