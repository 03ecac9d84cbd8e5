'use client';

import { useMemo, useState } from 'react';
import { PassageStrip } from '@/components/charts/passage-strip';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { draftFromPlan } from './draft-from-plan';
import { placeOfWaypoint } from './leg-measures';
import { createFocusStore } from './focus-store';
import { NotebookSection } from './notebook-section';
import { PageLinks } from './page-links';
import { PlanFields } from './plan-fields';
import { PlannerFormProvider } from './planner-context';
import { readNumber } from './read-number';
import { PlannerMap } from './planner-map';
import { PlannerVerdict } from './planner-verdict';
import { RESULT_LINKS, ResultView } from './result-view';
import { SaveBar } from './save-bar';
import { usePlanner } from './use-planner';
import { WaypointTable } from './waypoint-table';

export interface PlannerProps {
  readonly passage: PassagePlan & { readonly id: string; readonly revision: number };
  readonly boat: { readonly name: string; readonly sheetNumber: number; readonly sheet: BoatSheet };
}

const INPUT_LINKS = [
  ['track', 'Track'],
  ['departure', 'Departure'],
  ['wind', 'Wind'],
] as const;

/** The planner: map and strip, the plan in fields, and the check of what is typed just now. */
export function Planner({ passage, boat }: PlannerProps) {
  const [draft] = useState(() => draftFromPlan(passage, 'UTC'));
  const { sheet } = boat;
  const planner = usePlanner({ passageId: passage.id, revision: passage.revision, draft, sheet });
  const { form, check } = planner;
  const [selectedLeg, setSelectedLeg] = useState<number | null>(null);
  const [selectedWaypoint, setSelectedWaypoint] = useState<string | null>(null);
  const [focus] = useState(createFocusStore);
  const { plan } = form.reading;
  const current = useMemo(
    () => (check.status === 'current' && plan ? { result: check.result, plan, gustFactor: sheet.gustFactor } : null),
    [check, plan, sheet.gustFactor],
  );
  const waypoints = useMemo(
    () =>
      form.draft.waypoints.flatMap(({ id, name, corridor }, index) => {
        const place = placeOfWaypoint(form.draft, index);
        return place ? [{ id, name, index, corridorM: corridorShown(corridor), ...place }] : [];
      }),
    [form.draft],
  );
  const { dispatch } = form;
  return (
    <PlannerFormProvider value={form}>
      <SaveBar planner={planner} passageId={passage.id} />
      <p className="text-muted mb-4 text-sm">
        {boat.name}, boat sheet {boat.sheetNumber}. The check follows every change; saving stores it.
      </p>
      <PlannerVerdict planner={planner} reefNames={sheet.reefs.map((reef) => reef.name)} />
      <PageLinks links={current ? [...INPUT_LINKS, ...RESULT_LINKS] : INPUT_LINKS} />
      <div className="mt-6 grid gap-8 lg:grid-cols-[minmax(0,11fr)_minmax(0,9fr)]">
        <div className="min-w-0 self-start lg:sticky lg:top-20">
          <PlannerMap
            waypoints={waypoints}
            corridors={waypoints.slice(1).map((waypoint) => waypoint.corridorM)}
            selectedWaypoint={selectedWaypoint}
            onSelectWaypoint={setSelectedWaypoint}
            check={current}
            selectedLeg={selectedLeg}
            focus={focus}
            onAddWaypoint={(place) => dispatch({ type: 'addWaypoint', ...place })}
            onMoveWaypoint={(id, place) => dispatch({ type: 'moveWaypoint', id, ...place })}
            onInsertWaypoint={(shownLeg, place) => {
              // A waypoint whose place does not read is not on the map, so the map counts fewer legs.
              const legIndex = waypoints[shownLeg]?.index;
              if (legIndex !== undefined) dispatch({ type: 'insertWaypoint', legIndex, ...place });
            }}
            onSelectLeg={setSelectedLeg}
          />
        </div>
        <NotebookSection title="Track" anchor="track">
          <WaypointTable />
        </NotebookSection>
      </div>
      <div className="mt-8">
        <NotebookSection title="Passage strip" anchor="strip">
          {current ? (
            <PassageStrip {...current} selectedLeg={selectedLeg} onSelectLeg={setSelectedLeg} onFocus={focus.set} />
          ) : (
            <p className="text-muted text-sm">
              The legs are laid along time here as soon as track, departure and wind can be checked.
            </p>
          )}
        </NotebookSection>
      </div>
      <div className="mt-8">
        <PlanFields />
      </div>
      {current && (
        <div className="mt-10">
          <ResultView
            result={current.result}
            plan={current.plan}
            sheet={sheet}
            selectedLeg={selectedLeg}
            onSelectLeg={setSelectedLeg}
          />
        </div>
      )}
    </PlannerFormProvider>
  );
}

/** Half-width to draw, m: none where it does not read or is no width at all. */
function corridorShown(text: string): number {
  const value = readNumber(text);
  return value > 0 && value <= 50_000 ? value : 0;
}
