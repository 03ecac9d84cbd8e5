import type { MassKind } from '@/lib/schemas/boat-sheet';

/** Every number as it was typed: an empty field is missing, never zero. */
type Typed<Key extends string> = Record<Key, string>;

export type MassRow = Typed<'label' | 'kg' | 'yM' | 'zM'> & { kind: MassKind };
export type ReefRow = Typed<
  'name' | 'areaM2' | 'centreHeightM' | 'carryUpToMeanKn' | 'carryUpToGustKn' | 'speedFactor'
>;
export type LeewayRow = Typed<'angleDeg' | 'leewayDeg'>;

export interface PolarForm {
  windSpeedsKn: string[];
  windAnglesDeg: string[];
  speedsKn: string[][];
}

/** The edit form. Fields stand where the schema has them, so that its messages find them. */
export interface SheetForm {
  name: string;
  sheet: {
    spanM: string;
    masses: MassRow[];
    hasVaka: boolean;
    vaka: Typed<'waterplaneLengthM' | 'waterplaneBeamM' | 'waterplaneAreaM2' | 'buoyancyHeightM'>;
    hasAma: boolean;
    ama: Typed<'volumeL' | 'waterplaneM2'>;
    hasPod: boolean;
    pod: Typed<'lengthM' | 'breadthM' | 'depthM' | 'offsetM' | 'bottomHeightM'>;
    pressureKind: 'coefficient' | 'rule';
    pressure: Typed<'coefficient' | 'kgPerM2' | 'atKn'>;
    /** Levers are measured from the waterline: the centre of lateral resistance is left out. */
    fromWaterline: boolean;
    centreOfLateralResistanceM: string;
    gustFactor: string;
    workingMargin: string;
    windHeightExponent: string;
    reefs: ReefRow[];
    polar: PolarForm;
    closestAngleDeg: string;
    deepestAngleDeg: string;
    leewayKind: 'one' | 'byAngle';
    leewayOne: string;
    leewayDeg: LeewayRow[];
    shunt: Typed<'seconds' | 'driftKn'>;
    notes: string;
  };
}

export const emptyMass: MassRow = { label: '', kg: '', yM: '', zM: '', kind: 'structure' };
export const emptyReef: ReefRow = {
  name: '',
  areaM2: '',
  centreHeightM: '',
  carryUpToMeanKn: '',
  carryUpToGustKn: '',
  speedFactor: '1',
};
export const emptyLeeway: LeewayRow = { angleDeg: '', leewayDeg: '' };
