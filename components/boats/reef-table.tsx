import { Cell, DataTable, HeadCell } from '@/components/ui/data-table';
import { Panel } from '@/components/ui/panel';
import type { BoatFigures, ReefFigures } from './boat-figures';
import { NotKnown } from './not-known';
import { POINTS_OF_SAIL } from './points-of-sail';
import { figure, limitKn } from './show';
import { workingHolds } from './working-holds';
import { ShowWorking } from './working-steps';

/** The reef table: what the owner carries each sail up to beside what it holds up to. */
export function ReefTable({ figures }: { readonly figures: BoatFigures }) {
  const { sheet, reefs } = figures;
  return (
    <Panel title="Reef table">
      <p className="mb-3 max-w-prose">
        <strong>Carry up to</strong> is yours, from experience. <strong>Holds up to</strong> is worked: the mean wind in
        whose gust (× {figure(sheet.gustFactor, 2)}) the heeling moment, times the working margin of{' '}
        {figure(sheet.workingMargin, 2)}, reaches righting moment.
      </p>
      <DataTable caption="Reef table, full sail first">
        <thead>
          <tr>
            <HeadCell className="bg-panel sticky left-0">Reef</HeadCell>
            <HeadCell className="text-right">Carry up to</HeadCell>
            <HeadCell className="text-right">Holds up to, worst</HeadCell>
            {POINTS_OF_SAIL.map(({ point, words }) => (
              <HeadCell key={point} className="text-right">
                {point}
                <span className="block font-normal">{words}</span>
              </HeadCell>
            ))}
            <HeadCell className="text-right">Aback limit, gust</HeadCell>
            <HeadCell className="text-right">Area</HeadCell>
            <HeadCell className="text-right">Centre</HeadCell>
            <HeadCell className="text-right">Speed</HeadCell>
          </tr>
        </thead>
        <tbody>
          {reefs.map((row) => (
            <ReefRow key={row.reef.name} row={row} />
          ))}
        </tbody>
      </DataTable>
      <div className="mt-4">
        {reefs.map((row) => (
          <ShowWorking
            key={row.reef.name}
            of={`“${row.reef.name}” holds up to ${limitKn(row.holds.worstKn)}`}
            steps={workingHolds(figures, row)}
          />
        ))}
      </div>
    </Panel>
  );
}

function ReefRow({ row }: { readonly row: ReefFigures }) {
  const { reef, holds, byPoint, carriedTooFar } = row;
  return (
    <tr>
      <Cell className="bg-panel sticky left-0 min-w-24 font-bold">{reef.name}</Cell>
      <Cell className="text-right whitespace-nowrap">
        <Carry reef={reef} />
      </Cell>
      <Cell className="text-right whitespace-nowrap">
        <span className="font-bold">{limitKn(holds.worstKn)}</span>
        <span className="text-muted block text-sm">at {figure(holds.worstAngleDeg)}°</span>
        {carriedTooFar && <span className="text-thin block text-sm font-bold">carried beyond it</span>}
      </Cell>
      {POINTS_OF_SAIL.map(({ point }) => (
        <Cell key={point} className="text-right whitespace-nowrap">
          {byPoint[point] === null ? <span className="text-muted">not sailed</span> : limitKn(byPoint[point])}
        </Cell>
      ))}
      <Cell className="text-right whitespace-nowrap">
        <AbackLimit knots={row.abackLimitKn} />
      </Cell>
      <Cell className="text-right whitespace-nowrap">{figure(reef.areaM2, 2)} m²</Cell>
      <Cell className="text-right whitespace-nowrap">{figure(reef.centreHeightM, 2)} m</Cell>
      <Cell className="text-right whitespace-nowrap">× {figure(reef.speedFactor, 2)}</Cell>
    </tr>
  );
}

function Carry({ reef }: Pick<ReefFigures, 'reef'>) {
  const { carryUpToMeanKn: mean, carryUpToGustKn: gust } = reef;
  if (mean === undefined && gust === undefined) return <span className="text-muted">not given</span>;
  return (
    <>
      {mean !== undefined && <span className="block">{figure(mean, 1)} kn mean</span>}
      {gust !== undefined && <span className="block">{figure(gust, 1)} kn gust</span>}
    </>
  );
}

function AbackLimit({ knots }: { readonly knots: number | null }) {
  if (knots === null) return <NotKnown />;
  return knots === 0 ? <strong className="text-beyond">none</strong> : limitKn(knots);
}
