import { emptyLeeway, emptyMass, emptyReef, type SheetForm } from './sheet-form';

/** A form for a boat that nothing is known of yet. Common defaults are filled in; her own numbers are not guessed. */
export function newSheetForm(): SheetForm {
  return {
    name: '',
    sheet: {
      spanM: '',
      masses: [
        { ...emptyMass, label: 'Vaka', yM: '0' },
        { ...emptyMass, label: 'Ama' },
        { ...emptyMass, label: 'Akas' },
        { ...emptyMass, label: 'Mast, spars and sail', yM: '0', kind: 'rig' },
        { ...emptyMass, label: 'Helm', kind: 'crew' },
      ],
      hasVaka: false,
      vaka: { waterplaneLengthM: '', waterplaneBeamM: '', waterplaneAreaM2: '', buoyancyHeightM: '' },
      hasAma: false,
      ama: { volumeL: '', waterplaneM2: '' },
      hasPod: false,
      pod: { lengthM: '', breadthM: '', depthM: '', offsetM: '', bottomHeightM: '' },
      pressureKind: 'coefficient',
      pressure: { coefficient: '1.4', kgPerM2: '', atKn: '' },
      fromWaterline: false,
      centreOfLateralResistanceM: '',
      gustFactor: '1.35',
      workingMargin: '1.5',
      windHeightExponent: '0',
      reefs: [{ ...emptyReef, name: 'Full sail' }, { ...emptyReef }],
      polar: {
        windSpeedsKn: ['6', '12', '18'],
        windAnglesDeg: ['60', '90', '120', '150'],
        speedsKn: Array.from({ length: 3 }, () => Array.from({ length: 4 }, () => '')),
      },
      closestAngleDeg: '',
      deepestAngleDeg: '',
      leewayKind: 'one',
      leewayOne: '6',
      leewayDeg: [{ ...emptyLeeway }],
      shunt: { seconds: '75', driftKn: '0.8' },
      notes: '',
    },
  };
}
