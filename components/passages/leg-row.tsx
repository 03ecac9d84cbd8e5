'use client';

import { CellInput } from './cell-input';
import { legMeasures } from './leg-measures';
import { usePlannerForm } from './planner-context';
import { degreesOf, nmiOfMetres } from './show';
import { SmallButton } from './small-button';

interface LegRowProps {
  /** The waypoint the leg ends at, which is also the leg's number counted from 1. */
  readonly index: number;
  onInsert: () => void;
}

/** The leg into a waypoint: course true and magnetic, distance, room to each side. */
export function LegRow({ index, onInsert }: LegRowProps) {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const waypoint = draft.waypoints[index]!;
  const measures = legMeasures(draft, index - 1);
  return (
    <tr className="text-sm" data-testid="leg-row">
      <td aria-hidden="true" />
      <td className="pb-2">
        <div className="border-spruce/50 flex flex-wrap items-center gap-x-4 gap-y-1 border-l-2 border-dashed pl-3">
          <span className="font-bold">Leg {index}</span>
          {measures ? (
            <span className="tabular-nums">
              {degreesOf(measures.trueDeg)} T · {degreesOf(measures.magneticDeg)} M · {nmiOfMetres(measures.distanceM)}
            </span>
          ) : (
            <span className="text-muted">course and distance not known yet</span>
          )}
          <span className="flex items-center gap-2">
            <span aria-hidden="true" className="text-muted">
              corridor ±
            </span>
            <CellInput
              className="w-32"
              label={`Corridor half-width of leg ${index}`}
              hideLabel
              unit="m"
              inputMode="decimal"
              value={waypoint.corridor}
              onValue={(value) => dispatch({ type: 'setWaypoint', id: waypoint.id, field: 'corridor', value })}
              problem={problemAt(`/route/${index}/corridorHalfWidthM`)}
              maxLength={20}
            />
          </span>
          <SmallButton label={`Insert a waypoint in leg ${index}`} disabled={!measures} onClick={onInsert}>
            Insert
          </SmallButton>
        </div>
      </td>
    </tr>
  );
}
