'use client';

import { get, useFormContext } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { GroupProblem } from './form-fields';
import { listProblems } from './list-problems';
import { PolarCsv } from './polar-csv';
import { editPolar } from './polar-edits';
import { PolarGrid } from './polar-grid';
import type { PolarForm, SheetForm } from './sheet-form';
import { polarToForm } from './sheet-to-form';

/** More cells than this are no pleasure to type in, and slow. */
const MOST_CELLS = 600;

/** The polar: pasted, from a file, or typed into its grid. */
export function PolarSection() {
  const { watch, setValue, formState } = useFormContext<SheetForm>();
  const polar = watch('sheet.polar');
  const problems = listProblems(get(formState.errors, 'sheet.polar'), 'sheet.polar');
  const put = (next: PolarForm) =>
    setValue('sheet.polar', next, { shouldDirty: true, shouldValidate: formState.isSubmitted });
  const large = polar.windSpeedsKn.length * polar.windAnglesDeg.length > MOST_CELLS;
  return (
    <Panel title="Polar">
      <p className="text-muted mb-4 max-w-prose text-sm">
        Boat speed through the water with full sail, in knots, by true wind speed and true wind angle. Every wind needs
        every angle: nothing is guessed.
      </p>
      <PolarCsv onPolar={(next) => put(polarToForm(next))} />
      <div className="mt-6">
        <GroupProblem path="sheet.polar" />
        {problems.length > 0 && (
          <ul className="text-beyond mb-3 list-disc space-y-1 pl-5" data-testid="field-problem">
            {[...new Set(problems.map(({ path, message }) => `${placeIn(polar, path)}${message}`))]
              .slice(0, 12)
              .map((words) => (
                <li key={words}>{words}</li>
              ))}
          </ul>
        )}
        {large ? (
          <p>
            {polar.windSpeedsKn.length} wind speeds by {polar.windAnglesDeg.length} wind angles: too many to type into a
            grid. Change the file and take it over again.
          </p>
        ) : (
          <PolarGrid
            polar={polar}
            wrong={new Set(problems.map(({ path }) => path))}
            onEdit={(edit) => put(editPolar(polar, edit))}
          />
        )}
      </div>
    </Panel>
  );
}

/** "8 kn, 90°: " of a cell's path. */
function placeIn(polar: PolarForm, path: string): string {
  const cell = /\.speedsKn\.(\d+)\.(\d+)$/.exec(path);
  if (!cell) return '';
  return `${polar.windSpeedsKn[Number(cell[1])] || '?'} kn, ${polar.windAnglesDeg[Number(cell[2])] || '?'}°: `;
}
