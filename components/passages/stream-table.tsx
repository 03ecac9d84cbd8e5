'use client';

import { CellInput } from './cell-input';
import { PasteRows } from './paste-rows';
import { usePlannerForm } from './planner-context';
import { readStreamPaste } from './read-wind-paste';
import { SmallButton } from './small-button';
import { TimeField } from './time-field';

/** The stream by time, where the skipper has one; without rows the gap is stated, here and in the result. */
export function StreamTable() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  return (
    <div>
      {draft.streamRows.length === 0 ? (
        <p className="border-unknown border-l-2 pl-3 text-sm" data-testid="no-stream">
          No stream entered: the check leaves it out. Add rows that reach from departure to arrival if there is any.
        </p>
      ) : (
        <table className="w-full border-collapse text-left text-sm" data-testid="stream-table">
          <caption className="sr-only">Stream by time; toward degrees true, speed in knots</caption>
          <thead className="text-muted max-md:sr-only">
            <tr>
              <th className="py-1 font-normal">Time</th>
              <th className="py-1 font-normal">Sets toward, °T</th>
              <th className="py-1 font-normal">Drift, kn</th>
              <th>
                <span className="sr-only">Take out</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {draft.streamRows.map((row, i) => (
              <tr key={row.id} className="border-line border-t align-top max-md:grid max-md:grid-cols-[1fr_1fr_auto]">
                <td className="py-1.5 pr-2 max-md:col-span-3 md:w-1/2">
                  <TimeField
                    label={`Stream row ${i + 1}`}
                    hideLabel
                    value={row.time}
                    zone={draft.zone}
                    onValue={(value) => dispatch({ type: 'setStreamTime', id: row.id, value })}
                    problem={problemAt(`/streamRows/${i}/time`)}
                  />
                </td>
                <td className="py-1.5 pr-2">
                  <CellInput
                    label={`Stream row ${i + 1}, sets toward, degrees true`}
                    hideLabel
                    inputMode="decimal"
                    phoneLabel="toward °T"
                    value={row.toward}
                    onValue={(value) => dispatch({ type: 'setStreamRow', id: row.id, field: 'toward', value })}
                    problem={problemAt(`/streamRows/${i}/towardDeg`)}
                    maxLength={20}
                  />
                </td>
                <td className="py-1.5 pr-2">
                  <CellInput
                    label={`Stream row ${i + 1}, drift, knots`}
                    hideLabel
                    inputMode="decimal"
                    phoneLabel="drift, kn"
                    value={row.kn}
                    onValue={(value) => dispatch({ type: 'setStreamRow', id: row.id, field: 'kn', value })}
                    problem={problemAt(`/streamRows/${i}/kn`)}
                    maxLength={20}
                  />
                </td>
                <td className="py-1.5 text-right">
                  <SmallButton
                    label={`Take out stream row ${i + 1}`}
                    onClick={() => dispatch({ type: 'deleteStreamRow', id: row.id })}
                  >
                    ×
                  </SmallButton>
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
      <div className="mt-3">
        <SmallButton onClick={() => dispatch({ type: 'addStreamRow' })}>Add a stream row</SmallButton>
      </div>
      <PasteRows
        what="stream"
        columns="time, toward °true, kn"
        read={readStreamPaste}
        onRows={(rows, replace) => dispatch({ type: 'putStreamRows', rows, replace })}
      />
    </div>
  );
}
