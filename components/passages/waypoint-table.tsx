'use client';

import { Fragment, useState } from 'react';
import { LegRow } from './leg-row';
import { midpointOf } from './midpoint-of';
import { usePlannerForm } from './planner-context';
import { SmallButton } from './small-button';
import { WaypointRow } from './waypoint-row';

/** The route as a table that works without the map: waypoints, and between them the legs with course, distance and corridor. */
export function WaypointTable() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const [said, setSaid] = useState('');
  const { waypoints } = draft;
  const problem = problemAt('/route');
  return (
    <div>
      {waypoints.length === 0 && (
        <p className="border-spruce border-l-2 pl-3 text-sm">
          No waypoints yet. Click the map where you leave from, then on along the way; or add one here and type its
          place.
        </p>
      )}
      {waypoints.length > 0 && (
        <table className="w-full border-collapse text-left" data-testid="waypoint-table">
          <caption className="sr-only">Waypoints and the legs between them</caption>
          <tbody>
            {waypoints.map((waypoint, index) => (
              <Fragment key={waypoint.id}>
                {index > 0 && (
                  <LegRow
                    index={index}
                    onInsert={() => {
                      const at = midpointOf(draft, index - 1);
                      if (at) dispatch({ type: 'insertWaypoint', legIndex: index - 1, ...at });
                    }}
                  />
                )}
                <WaypointRow index={index} onSay={setSaid} />
              </Fragment>
            ))}
          </tbody>
        </table>
      )}
      {problem && (
        <p className="text-beyond mt-2 text-sm" data-testid="field-problem">
          {problem}
        </p>
      )}
      <p className="sr-only" aria-live="polite">
        {said}
      </p>
      <div className="mt-3 flex flex-wrap gap-2">
        <SmallButton onClick={() => dispatch({ type: 'addEmptyWaypoint' })}>Add a waypoint by its place</SmallButton>
        {waypoints.length > 1 && (
          <SmallButton onClick={() => dispatch({ type: 'reverseRoute' })}>Turn the route round</SmallButton>
        )}
      </div>
    </div>
  );
}
