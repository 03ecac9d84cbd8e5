'use client';

import { CellInput } from './cell-input';
import { DepartureFields } from './departure-fields';
import { LimitsFields } from './limits-fields';
import { NotebookSection } from './notebook-section';
import { usePlannerForm } from './planner-context';
import { StreamTable } from './stream-table';
import { WaypointTable } from './waypoint-table';
import { WindTable } from './wind-table';

/** Everything of the plan that is typed, in the order one plans. */
export function PlanFields() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  return (
    <div className="min-w-0 space-y-8">
      <CellInput
        label="Passage name"
        value={draft.name}
        onValue={(value) => dispatch({ type: 'setText', field: 'name', value })}
        problem={problemAt('/name')}
        maxLength={160}
      />
      <NotebookSection title="Track">
        <WaypointTable />
      </NotebookSection>
      <NotebookSection title="Departure">
        <DepartureFields />
      </NotebookSection>
      <NotebookSection title="Wind">
        <WindTable />
      </NotebookSection>
      <NotebookSection title="Stream">
        <StreamTable />
      </NotebookSection>
      <NotebookSection title="Your limits">
        <LimitsFields />
      </NotebookSection>
    </div>
  );
}
