import { RightingCurveChart, type CurveMark } from '@/components/charts/righting-curve-chart';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import type { BoatFigures } from './boat-figures';
import { curvePoints } from './curve-points';
import { NotKnown } from './not-known';
import { missingMeasures } from './sheet-findings';
import { figure, kgM } from './show';
import { workingCurve } from './working-curve';
import { ShowWorking } from './working-steps';

/** Righting moment by heel, drawn and in figures. */
export function CurvePanel({ figures }: { readonly figures: BoatFigures }) {
  const { curve } = figures.prepared;
  const { vaka, pod } = figures.sheet;
  if (!curve) {
    return <NotKnown>To draw the righting curve, measure {missingMeasures(figures.sheet).join(' and ')}.</NotKnown>;
  }
  const byHandNm = uprightRightingMomentNm(figures.sums);
  const marks: CurveMark[] = [{ word: 'lift-off', heelDeg: curve.liftOffDeg }];
  if (curve.touchdownDeg !== null) marks.push({ word: 'touchdown', heelDeg: curve.touchdownDeg });
  if (curve.vanishingDeg !== null) marks.push({ word: 'vanishing', heelDeg: curve.vanishingDeg });
  const marksInWords = marks.map(({ word, heelDeg }) => `${word} at ${figure(heelDeg, 1)}°`).join(', ');
  return (
    <div className="space-y-4">
      <RightingCurveChart
        points={curvePoints(curve)}
        byHandNm={byHandNm}
        marks={marks}
        label={`Righting moment by heel: ${marksInWords}; ${kgM(curve.liftOffMomentNm)} at lift-off, ${kgM(byHandNm)} by hand upright.`}
      />
      <p>
        Righting moment peaks as the ama leaves the water, at {kgM(curve.liftOffMomentNm)}, and falls from there
        {pod ? ' until the pod touches' : ''}. By hand, with the lever upright, it is {kgM(byHandNm)}: the load share
        uses that; the real peak is {curve.liftOffMomentNm < byHandNm ? 'lower' : 'not lower here'}.
        {curve.vanishingDeg === null &&
          ' No vanishing angle is found up to 90°, in flat water and with all aboard in place.'}
      </p>
      {!pod && <p className="text-muted text-sm">No lee pod is recorded, so touchdown is left out of the curve.</p>}
      {vaka && vaka.waterplaneAreaM2 === undefined && (
        <p className="text-muted text-sm">
          The vaka’s waterplane is taken as 0.7 · L · b, a common default; type its measured area to do without.
        </p>
      )}
      <ShowWorking of="the curve" steps={workingCurve(figures)} />
    </div>
  );
}
