import { Panel } from '@/components/ui/panel';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { BigFigure } from './big-figure';
import type { BoatFigures } from './boat-figures';
import { CurvePanel } from './curve-panel';
import { figure, kgM, newtonM, percent } from './show';
import { workingRighting } from './working-righting';
import { ShowWorking } from './working-steps';

/** Righting moment by hand, with its sums, and as curve. */
export function RightingPanel({ figures }: { readonly figures: BoatFigures }) {
  const { sums, amaLoadKg } = figures;
  const momentNm = uprightRightingMomentNm(sums);
  return (
    <Panel title="Righting moment">
      <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-2">
        <div className="min-w-0">
          <dl className="mb-4 grid grid-cols-2 gap-x-6 gap-y-3 sm:grid-cols-3">
            <BigFigure what="By hand, RM0" aside={newtonM(momentNm)}>
              {kgM(momentNm)}
            </BigFigure>
            <BigFigure what="Ama load at rest" aside={`${percent(amaLoadKg / sums.massKg)} of her mass`}>
              {figure(amaLoadKg)} kg
            </BigFigure>
            <BigFigure what="Mass, M = Σm">{figure(sums.massKg)} kg</BigFigure>
            <BigFigure what="Sy = Σm·y" aside="toward the ama">
              {figure(sums.momentYKgM, 1)} kg·m
            </BigFigure>
            <BigFigure what="Sz = Σm·z" aside="over the waterline">
              {figure(sums.momentZKgM, 1)} kg·m
            </BigFigure>
          </dl>
          <ShowWorking of="the righting moment by hand" steps={workingRighting(figures)} />
        </div>
        <div className="min-w-0">
          <h3 className="mb-2 font-bold">By heel</h3>
          <CurvePanel figures={figures} />
        </div>
      </div>
    </Panel>
  );
}
