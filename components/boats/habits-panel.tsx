import { Panel } from '@/components/ui/panel';
import { pressureCoefficient } from '@/lib/rigging/pressure';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { FactList, type Fact } from './fact-list';
import { figure } from './show';

/** Wind, margins, angles and shunts: the owner's choices that everything else is worked with. */
export function HabitsPanel({ sheet }: { readonly sheet: BoatSheet }) {
  const { pressure, leewayDeg } = sheet;
  const coefficient = figure(pressureCoefficient(pressure), 2);
  const facts: Fact[] = [
    {
      what: 'Sail pressure',
      value:
        'coefficient' in pressure
          ? `C = ${coefficient}`
          : `${figure(pressure.kgPerM2, 1)} kg/m² at ${figure(pressure.atKn, 1)} kn, so C = ${coefficient}`,
    },
    { what: 'Working margin', value: figure(sheet.workingMargin, 2) },
    { what: 'Gust factor', value: `× ${figure(sheet.gustFactor, 2)}` },
    {
      what: 'Wind height exponent',
      value: sheet.windHeightExponent === 0 ? '0: the forecast’s wind as it is' : figure(sheet.windHeightExponent, 2),
    },
    {
      what: 'Centre of lateral resistance',
      value:
        sheet.centreOfLateralResistanceM === 0
          ? '0: levers measured from the waterline'
          : `${figure(sheet.centreOfLateralResistanceM, 2)} m`,
    },
    { what: 'Closest angle', value: angleOf(sheet.closestAngleDeg) },
    { what: 'Deepest angle', value: angleOf(sheet.deepestAngleDeg) },
    {
      what: 'Leeway',
      value:
        typeof leewayDeg === 'number'
          ? `${figure(leewayDeg, 1)}°`
          : leewayDeg.map((row) => `${figure(row.leewayDeg, 1)}° at ${figure(row.angleDeg)}°`).join(', '),
    },
    { what: 'A shunt takes', value: `${figure(sheet.shunt.seconds)} s` },
    { what: 'Drift in a shunt', value: `${figure(sheet.shunt.driftKn, 1)} kn` },
  ];
  return (
    <Panel title="Wind, margins and habits">
      <FactList facts={facts} />
    </Panel>
  );
}

function angleOf(deg: number | undefined): string {
  return deg === undefined ? 'best speed made good, by the polar' : `${figure(deg, 1)}°`;
}
