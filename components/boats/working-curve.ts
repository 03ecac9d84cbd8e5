import { vakaWaterplane } from '@/lib/rigging/vaka-waterplane';
import { SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { BoatFigures } from './boat-figures';
import { figure, kgM, newtonM } from './show';
import type { WorkingStep } from './working';

const HYDROSTATICS = 'hydrostatics of wall-sided hulls in flat water';

/** The righting curve's own figures; none without the measures it needs. */
export function workingCurve({ sheet, sums, amaLoadKg, prepared }: BoatFigures): readonly WorkingStep[] {
  const { curve } = prepared;
  const { vaka, ama, pod } = sheet;
  if (!curve || !vaka || ama?.waterplaneM2 === undefined) return [];
  const { areaM2 } = vakaWaterplane(vaka, sums.massKg);
  const immersion = figure(curve.amaImmersionAtRestM, 3);
  const sinkage = figure(curve.sinkageAtLiftOffM, 3);
  const water = `${SEA_WATER_KG_M3} kg/m³`;
  const metacentreM = vaka.buoyancyHeightM + curve.metacentricRadiusM;
  const steps: WorkingStep[] = [
    {
      what: 'Ama’s immersion at rest, Ta',
      equation: '(Sy ÷ B) ÷ (ρw · ama’s waterplane area)',
      numbers: `${figure(amaLoadKg, 1)} kg ÷ (${water} × ${figure(ama.waterplaneM2, 3)} m²)`,
      result: `${immersion} m`,
      source: HYDROSTATICS,
    },
    {
      what: 'Vaka’s sinkage as the ama leaves the water, sl',
      equation: '(Sy ÷ B) ÷ (ρw · Aw)',
      numbers: `${figure(amaLoadKg, 1)} kg ÷ (${water} × ${figure(areaM2, 3)} m²${vaka.waterplaneAreaM2 === undefined ? ', which is 0.7 · L · b, a common default' : ''})`,
      result: `${sinkage} m`,
      source: HYDROSTATICS,
    },
    {
      what: 'Lift-off',
      equation: 'φl = atan((Ta + sl) ÷ B)',
      numbers: `atan((${immersion} m + ${sinkage} m) ÷ ${figure(sheet.spanM, 3)} m)`,
      result: `${figure(curve.liftOffDeg, 1)}°`,
    },
    {
      what: 'Metacentre over the waterline, zB + BM',
      equation: 'zB + (0.7 · L · b³ ÷ 12) ÷ (M ÷ ρw)',
      numbers: `${figure(vaka.buoyancyHeightM, 3)} m + (0.7 × ${figure(vaka.waterplaneLengthM, 3)} m × (${figure(vaka.waterplaneBeamM, 3)} m)³ ÷ 12) ÷ (${figure(sums.massKg, 1)} kg ÷ ${water})`,
      result: `${figure(metacentreM, 3)} m`,
      source: 'BM = I ÷ ∇; the 0.7 of a slender hull is judgement, no source',
    },
    {
      what: 'Righting moment at lift-off, the curve’s peak',
      equation: `g · [Sy · cos φl − (Sz − M · (zB + BM)) · sin φl]${pod ? ' + pod' : ''}`,
      numbers: `9.80665 m/s² × [${figure(sums.momentYKgM, 1)} kg·m × cos ${figure(curve.liftOffDeg, 1)}° − (${figure(sums.momentZKgM, 1)} kg·m − ${figure(sums.massKg, 1)} kg × ${figure(metacentreM, 3)} m) × sin ${figure(curve.liftOffDeg, 1)}°]${curve.podImmersionMAt(curve.liftOffDeg) > 0 ? ' + what the pod, wet already, adds' : ''}`,
      result: `${newtonM(curve.liftOffMomentNm)} (${kgM(curve.liftOffMomentNm)})`,
      source: 'statics of a heeled hull turning about her metacentre',
    },
  ];
  if (pod && curve.touchdownDeg !== null) {
    steps.push({
      what: 'Touchdown of the pod',
      equation: 'φp = atan((hp − sl) ÷ yp)',
      numbers: `atan((${figure(pod.bottomHeightM, 3)} m − ${sinkage} m) ÷ ${figure(pod.offsetM, 3)} m)`,
      result: `${figure(curve.touchdownDeg, 1)}°`,
    });
  }
  return steps;
}
