'use client';

import { beaufortForce } from '@/lib/weather/beaufort';
import { CellInput } from './cell-input';
import { PasteRows } from './paste-rows';
import { usePlannerForm } from './planner-context';
import { readNumber } from './read-number';
import { readWindPaste } from './read-wind-paste';
import { SampleForecastButton } from './sample-forecast-button';
import { SmallButton } from './small-button';
import { TimeField } from './time-field';

/** The forecast wind, typed, pasted or taken from the sample: rows are instants, and it holds from the first to the last. */
export function WindTable() {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const problem = problemAt('/wind/rows');
  return (
    <div>
      <div className="grid gap-3 sm:grid-cols-2">
        <CellInput
          label="Source of the wind, in words"
          value={draft.windSource}
          onValue={(value) => dispatch({ type: 'setText', field: 'windSource', value })}
          problem={problemAt('/wind/source')}
          placeholder="Marine forecast by radio"
          maxLength={250}
        />
        <TimeField
          label="Issued"
          value={draft.windIssued}
          zone={draft.zone}
          onValue={(value) => dispatch({ type: 'setTime', field: 'windIssued', value })}
          problem={problemAt('/wind/issuedAt')}
        />
      </div>
      {draft.windRows.length === 0 ? (
        <p className="border-spruce mt-3 border-l-2 pl-3 text-sm">
          No wind yet, so nothing can be checked. Add a row for each time of the forecast: steady wind needs two, one
          before departure and one after arrival.
        </p>
      ) : (
        <table className="mt-3 w-full border-collapse text-left text-sm" data-testid="wind-table">
          <caption className="sr-only">Wind by time; directions true, speeds in knots</caption>
          <thead className="text-muted max-md:sr-only">
            <tr>
              <th className="py-1 font-normal">Time</th>
              <th className="py-1 font-normal">From, °T</th>
              <th className="py-1 font-normal">Mean, kn</th>
              <th className="py-1 font-normal">Gust, kn</th>
              <th className="py-1 font-normal">Force</th>
              <th>
                <span className="sr-only">Take out</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {draft.windRows.map((row, i) => (
              <WindRow key={row.id} index={i} />
            ))}
          </tbody>
        </table>
      )}
      {problem && (
        <p className="text-beyond mt-2 text-sm" data-testid="field-problem">
          {problem}
        </p>
      )}
      <div className="mt-3 flex flex-wrap gap-2">
        <SmallButton onClick={() => dispatch({ type: 'addWindRow' })}>Add a wind row</SmallButton>
        <SampleForecastButton />
      </div>
      <PasteRows
        what="wind"
        columns="time, from °true, mean kn, gust kn (may be left out)"
        read={readWindPaste}
        onRows={(rows, replace) => dispatch({ type: 'putWindRows', rows, replace })}
      />
    </div>
  );
}

function WindRow({ index }: { readonly index: number }) {
  const { draft, dispatch, problemAt } = usePlannerForm();
  const row = draft.windRows[index]!;
  const number = index + 1;
  const mean = readNumber(row.mean);
  const at = `/wind/rows/${index}`;
  const set = (field: 'from' | 'mean' | 'gust') => (value: string) =>
    dispatch({ type: 'setWindRow', id: row.id, field, value });
  const cell = 'py-1.5 pr-2 max-md:min-w-0';
  const shared = { hideLabel: true, inputMode: 'decimal', maxLength: 20 } as const;
  return (
    <tr
      className="border-line border-t align-top max-md:grid max-md:grid-cols-[1fr_1fr_1fr_auto] max-md:py-1"
      data-testid="wind-row"
    >
      <td className={`${cell} max-md:order-1 max-md:col-span-3 md:w-[38%]`}>
        <TimeField
          label={`Wind row ${number}`}
          hideLabel
          value={row.time}
          zone={draft.zone}
          onValue={(value) => dispatch({ type: 'setWindTime', id: row.id, value })}
          problem={problemAt(`${at}/time`)}
        />
      </td>
      <td className={`${cell} max-md:order-3`}>
        <CellInput
          {...shared}
          label={`Wind row ${number}, from, degrees true`}
          value={row.from}
          onValue={set('from')}
          problem={problemAt(`${at}/fromDeg`)}
          phoneLabel="from °T"
        />
      </td>
      <td className={`${cell} max-md:order-3`}>
        <CellInput
          {...shared}
          label={`Wind row ${number}, mean, knots`}
          value={row.mean}
          onValue={set('mean')}
          problem={problemAt(`${at}/meanKn`)}
          phoneLabel="mean, kn"
        />
      </td>
      <td className={`${cell} max-md:order-3`}>
        <CellInput
          {...shared}
          label={`Wind row ${number}, gust, knots`}
          value={row.gust}
          onValue={set('gust')}
          problem={problemAt(`${at}/gustKn`)}
          phoneLabel="gust, kn"
        />
      </td>
      <td className="py-1.5 pt-4 pr-2 whitespace-nowrap tabular-nums max-md:order-4 max-md:self-end max-md:py-3.5">
        {Number.isNaN(mean) || mean < 0 ? '–' : `force ${beaufortForce(mean)}`}
      </td>
      <td className="py-1.5 text-right max-md:order-2">
        <SmallButton
          label={`Take out wind row ${number}`}
          onClick={() => dispatch({ type: 'deleteWindRow', id: row.id })}
        >
          ×
        </SmallButton>
      </td>
    </tr>
  );
}
