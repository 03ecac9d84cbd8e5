'use client';

import { useId } from 'react';
import { CellInput } from './cell-input';
import { usePlannerForm } from './planner-context';

const FIELDS = [
  ['meanKn', 'Mean wind', 'kn'],
  ['gustKn', 'Gust', 'kn'],
  ['loadShare', 'Load share', ''],
  ['shuntsPerHour', 'Shunts an hour', '/h'],
  ['hours', 'Hours under way', 'h'],
] as const;

/** The skipper's own limits, each optional: what goes over one is flagged, whatever the moments say. */
export function LimitsFields() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const id = useId();
  return (
    <div className="grid grid-cols-2 gap-3 lg:grid-cols-3">
      {FIELDS.map(([field, label, unit]) => (
        <CellInput
          key={field}
          label={`${label}, at most`}
          unit={unit}
          inputMode="decimal"
          value={draft.limits[field]}
          onValue={(value) => dispatch({ type: 'setLimit', field, value })}
          problem={problemAt(`/limits/${field}`)}
          maxLength={20}
        />
      ))}
      <div>
        <label htmlFor={id} className="text-muted mb-1 block text-sm">
          Sailing after dark
        </label>
        <select
          id={id}
          className="border-line bg-ground min-h-10 w-full border px-2"
          value={draft.limits.afterDark}
          onChange={(event) => dispatch({ type: 'setLimit', field: 'afterDark', value: event.target.value })}
        >
          <option value="">no limit set</option>
          <option value="yes">is accepted</option>
          <option value="no">is not wanted</option>
        </select>
      </div>
    </div>
  );
}
