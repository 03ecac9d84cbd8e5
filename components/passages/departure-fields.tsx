'use client';

import { useId } from 'react';
import { CellInput } from './cell-input';
import { isZone } from './plan-from-draft';
import { usePlannerForm } from './planner-context';
import { readTime, timeToDraft } from './read-time';
import { SmallButton } from './small-button';
import { TimeField } from './time-field';
import { useZones } from './use-zones';

const HOUR_MS = 3_600_000;

/** When she leaves, and by which clocks every time on the page is read. */
export function DepartureFields() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const zones = useZones();
  const listId = useId();
  const zone = isZone(draft.zone) ? draft.zone : 'UTC';
  const reading = readTime(draft.departure, zone);
  const shift = (hours: number) => {
    if (reading.kind !== 'instant') return;
    dispatch({ type: 'setTime', field: 'departure', value: timeToDraft(reading.epochMs + hours * HOUR_MS, zone) });
  };
  return (
    <div className="grid gap-3 sm:grid-cols-2">
      <div>
        <TimeField
          label="Departure"
          value={draft.departure}
          zone={draft.zone}
          onValue={(value) => dispatch({ type: 'setTime', field: 'departure', value })}
          problem={problemAt('/departure')}
        />
        <div className="mt-2 flex gap-2">
          <SmallButton disabled={reading.kind !== 'instant'} onClick={() => shift(-1)}>
            1 h earlier
          </SmallButton>
          <SmallButton disabled={reading.kind !== 'instant'} onClick={() => shift(1)}>
            1 h later
          </SmallButton>
        </div>
      </div>
      <div>
        <CellInput
          label="Time zone"
          value={draft.zone}
          onValue={(value) => dispatch({ type: 'setText', field: 'zone', value })}
          problem={problemAt('/zone')}
          hint="All times on this page are read by the clocks of this zone."
          list={listId}
          maxLength={64}
        />
        <datalist id={listId}>
          {zones.map((name) => (
            <option key={name} value={name} />
          ))}
        </datalist>
      </div>
    </div>
  );
}
