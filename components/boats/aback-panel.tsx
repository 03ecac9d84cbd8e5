import { Panel } from '@/components/ui/panel';
import { GRAVITY_M_S2, SEA_WATER_KG_M3 } from '@/lib/units/constants';
import type { BoatFigures } from './boat-figures';
import { BigFigure } from './big-figure';
import { NotKnown } from './not-known';
import { figure, kgM, limitKn, newtonM } from './show';
import { ShowWorking } from './working-steps';

/** What is left when the wind comes on the wrong side. */
export function AbackPanel({ figures }: { readonly figures: BoatFigures }) {
  const { abackRightingNm: momentNm, sheet, sums, reefs } = figures;
  const volumeL = sheet.ama?.volumeL;
  if (momentNm === null || volumeL === undefined) {
    return (
      <Panel title="Aback">
        <NotKnown>
          What she holds with the wind on the wrong side needs the ama’s whole volume in litres: measure it from the
          lines, or by filling.
        </NotKnown>
      </Panel>
    );
  }
  return (
    <Panel title="Aback">
      {momentNm <= 0 ? (
        <p className="text-beyond font-bold">
          She has no reserve aback: the ama goes under by what presses on it already ({kgM(momentNm)}).
        </p>
      ) : (
        <dl className="mb-3 grid grid-cols-2 gap-x-6 gap-y-3 sm:grid-cols-3">
          <BigFigure what="Reserve aback, RMa" aside={newtonM(momentNm)}>
            {kgM(momentNm)}
          </BigFigure>
          {reefs.map(({ reef, abackLimitKn }) => (
            <BigFigure key={reef.name} what={`Aback limit, “${reef.name}”`} aside="gust, beam-on, at rest">
              {abackLimitKn === null ? 'not known' : limitKn(abackLimitKn)}
            </BigFigure>
          ))}
        </dl>
      )}
      <p className="text-muted mb-3 text-sm">No working margin is kept in the aback limit.</p>
      <ShowWorking
        of="the reserve aback"
        steps={[
          {
            what: 'Righting moment aback, RMa',
            equation: 'g · (ρw · V · B − Sy), V the ama’s whole volume',
            numbers: `${GRAVITY_M_S2} m/s² × (${SEA_WATER_KG_M3} kg/m³ × ${figure(volumeL / 1000, 4)} m³ × ${figure(sheet.spanM, 3)} m − ${figure(sums.momentYKgM, 1)} kg·m)`,
            result: `${newtonM(momentNm)} (${kgM(momentNm)})`,
            source: 'statics: the ama pressed wholly under, less what the masses press on it',
          },
          {
            what: 'Aback limit of a reef',
            equation: 'HM0 = RMa, beam-on at rest; HM0 as in the heeling moment’s working',
            numbers: reefs.map(({ reef }) => `“${reef.name}” ${figure(reef.areaM2, 2)} m²`).join(', '),
            result: reefs.map(({ abackLimitKn }) => (abackLimitKn ? limitKn(abackLimitKn) : 'none')).join(', '),
          },
        ]}
      />
    </Panel>
  );
}
