'use client';

import { CellInput } from './cell-input';
import { DepartureFields } from './departure-fields';
import { LimitsFields } from './limits-fields';
import { NotebookSection } from './notebook-section';
import { usePlannerForm } from './planner-context';
import { StreamTable } from './stream-table';
import { WindTable } from './wind-table';

/** What is typed beside the track: name and departure, wind, stream, limits. */
export function PlanFields() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  return (
    <div className="grid gap-8 lg:grid-cols-2">
      <div className="min-w-0 space-y-8">
        <NotebookSection title="Departure" anchor="departure">
          <div className="space-y-3">
            <CellInput
              label="Passage name"
              value={draft.name}
              onValue={(value) => dispatch({ type: 'setText', field: 'name', value })}
              problem={problemAt('/name')}
              maxLength={160}
            />
            <DepartureFields />
          </div>
        </NotebookSection>
        <NotebookSection title="Stream">
          <StreamTable />
        </NotebookSection>
        <NotebookSection title="Your limits">
          <LimitsFields />
        </NotebookSection>
      </div>
      <NotebookSection title="Wind" anchor="wind">
        <WindTable />
      </NotebookSection>
    </div>
  );
}
