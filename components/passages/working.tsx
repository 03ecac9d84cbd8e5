import { Disclosure } from '@/components/ui/disclosure';
import { worstLegIndex } from '@/lib/passage-check/describe';
import type { CheckResult } from '@/lib/passages/passage';
import { pressureCoefficient } from '@/lib/rigging/pressure';
import { sumMasses } from '@/lib/rigging/sum-masses';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { AIR_KG_M3, GRAVITY_M_S2, M_S_PER_KNOT } from '@/lib/units/constants';
import { kilogramMetres, loadShareText, newtonMetres } from './show';

/** The equations behind the worst step's load share, each with the numbers put into it, for checking by hand. */
export function Working({ result, sheet }: { readonly result: CheckResult; readonly sheet: BoatSheet }) {
  const index = worstLegIndex(result.legs);
  const leg = index === null ? undefined : result.legs[index];
  if (!leg || leg.heelingMomentNewtonM === null || leg.rightingMomentNewtonM === null) return null;
  const { momentYKgM } = sumMasses(sheet.masses);
  const coefficient = pressureCoefficient(sheet.pressure);
  const reefIndex = leg.flags.find((flag) => flag.numbers.loadShare === leg.largestLoadShare)?.numbers.reefIndex;
  const reef = reefIndex === undefined ? undefined : sheet.reefs[reefIndex];
  const leverM = reef ? reef.centreHeightM - sheet.centreOfLateralResistanceM : null;
  const apparentKn =
    reef && leverM
      ? Math.sqrt(leg.heelingMomentNewtonM / (0.5 * AIR_KG_M3 * coefficient * reef.areaM2 * leverM)) / M_S_PER_KNOT
      : null;
  return (
    <Disclosure summary={`Show working of leg ${index! + 1}, its largest load share`}>
      <dl className="space-y-3 text-sm tabular-nums [&_dt]:font-bold">
        <div>
          <dt>Righting moment, RM0 = g · Σ(kg · y)</dt>
          <dd>
            {GRAVITY_M_S2} × {momentYKgM.toFixed(1)} kg·m = {newtonMetres(leg.rightingMomentNewtonM)} (
            {kilogramMetres(leg.rightingMomentNewtonM)}). First moments of mass, upright lever; the real peak is lower.
          </dd>
        </div>
        <div>
          <dt>Heeling moment in the gust, HM0 = ½ · ρ · V² · C · A · (zCE − zCLR)</dt>
          <dd>
            {reef && apparentKn && leverM
              ? `½ × ${AIR_KG_M3} kg/m³ × (${apparentKn.toFixed(1)} kn × ${M_S_PER_KNOT.toFixed(4)})² × ${coefficient.toFixed(3)} × ${reef.areaM2} m² × ${leverM.toFixed(2)} m = `
              : ''}
            {newtonMetres(leg.heelingMomentNewtonM)} ({kilogramMetres(leg.heelingMomentNewtonM)})
            {reef && apparentKn ? `, with “${reef.name}” in ${apparentKn.toFixed(1)} kn of apparent wind.` : '.'}{' '}
            Dynamic pressure of the full apparent wind on the sail.
          </dd>
        </div>
        <div>
          <dt>Load share, HM0 ÷ RM0</dt>
          <dd>
            {newtonMetres(leg.heelingMomentNewtonM)} ÷ {newtonMetres(leg.rightingMomentNewtonM)} ={' '}
            {loadShareText(leg.heelingMomentNewtonM / leg.rightingMomentNewtonM)}; within the working margin of{' '}
            {sheet.workingMargin} up to {loadShareText(1 / sheet.workingMargin)}.
          </dd>
        </div>
      </dl>
    </Disclosure>
  );
}
