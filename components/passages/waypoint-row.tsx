'use client';

import { CellInput } from './cell-input';
import { usePlannerForm } from './planner-context';
import { SmallButton } from './small-button';

interface WaypointRowProps {
  readonly index: number;
  /** Says aloud what a button has done. */
  onSay: (words: string) => void;
}

/** One waypoint: name, place, and buttons that move it along the route or take it out. */
export function WaypointRow({ index, onSay }: WaypointRowProps) {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const waypoint = draft.waypoints[index]!;
  const { id } = waypoint;
  const last = draft.waypoints.length - 1;
  const called = waypoint.name.trim() || `waypoint ${index + 1}`;
  const set = (field: 'name' | 'lat' | 'lon') => (value: string) => dispatch({ type: 'setWaypoint', id, field, value });
  const shift = (by: -1 | 1) => {
    dispatch({ type: 'shiftWaypoint', id, by });
    onSay(`${called} is now waypoint ${index + by + 1} of ${last + 1}.`);
  };
  return (
    <tr className="border-line border-t align-top" data-testid="waypoint-row">
      <th scope="row" className="w-8 py-2 pt-4 pr-2 text-right font-bold tabular-nums">
        {index + 1}
      </th>
      <td className="py-2">
        <div className="grid grid-cols-[minmax(0,1fr)_minmax(0,1fr)] gap-2 md:grid-cols-[minmax(0,3fr)_minmax(0,2.4fr)_minmax(0,2.4fr)_auto]">
          <CellInput
            className="max-md:order-1"
            label={`Name of waypoint ${index + 1}`}
            hideLabel
            value={waypoint.name}
            onValue={set('name')}
            problem={problemAt(`/route/${index}/name`) ?? problemAt(`/route/${index}`)}
            maxLength={120}
          />
          <CellInput
            className="max-md:order-3"
            label={`Latitude of waypoint ${index + 1}, degrees`}
            hideLabel
            value={waypoint.lat}
            onValue={set('lat')}
            problem={problemAt(`/route/${index}/lat`)}
            placeholder="48°32.1′N"
            maxLength={40}
          />
          <CellInput
            className="max-md:order-4"
            label={`Longitude of waypoint ${index + 1}, degrees`}
            hideLabel
            value={waypoint.lon}
            onValue={set('lon')}
            problem={problemAt(`/route/${index}/lon`)}
            placeholder="123°01.9′W"
            maxLength={40}
          />
          <span className="flex items-start justify-end max-md:order-2">
            <SmallButton label={`Move ${called} up`} disabled={index === 0} onClick={() => shift(-1)}>
              ↑
            </SmallButton>
            <SmallButton label={`Move ${called} down`} disabled={index === last} onClick={() => shift(1)}>
              ↓
            </SmallButton>
            <SmallButton
              label={`Delete ${called}`}
              onClick={() => {
                dispatch({ type: 'deleteWaypoint', id });
                onSay(`${called} is deleted. Undo brings it back.`);
              }}
            >
              ×
            </SmallButton>
          </span>
        </div>
      </td>
    </tr>
  );
}
