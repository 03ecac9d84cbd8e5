'use client';

import { useFormContext } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { massKinds } from '@/lib/schemas/boat-sheet';
import { GroupProblem, NumberField, SelectField, TextField } from './form-fields';
import { RowButtons } from './row-buttons';
import { RowsFoot } from './rows-foot';
import { emptyMass, type SheetForm } from './sheet-form';
import { useRows } from './use-rows';

const GRID = 'grid grid-cols-3 gap-x-3 gap-y-2 md:grid-cols-[minmax(0,1fr)_6rem_6rem_6rem_8rem_9rem] md:items-start';

/** Every mass item with where it stands. */
export function MassesSection() {
  const { watch } = useFormContext<SheetForm>();
  const { fields, append, ...rows } = useRows('sheet.masses');
  return (
    <Panel title="Masses">
      <p className="text-muted mb-3 max-w-prose text-sm">
        Weigh her in parts. y is measured from the vaka’s centreline toward the ama, negative to leeward; z up from the
        loaded waterline, negative under it. Everything aboard counts, people too.
      </p>
      <GroupProblem path="sheet.masses" />
      <div aria-hidden="true" className={`text-muted mb-1 hidden text-sm font-bold md:grid ${GRID}`}>
        <span>Item</span>
        <span>Mass, kg</span>
        <span>y, m</span>
        <span>z, m</span>
        <span>Kind</span>
      </div>
      <ol className="space-y-3 md:space-y-2">
        {fields.map((field, index) => {
          const name = watch(`sheet.masses.${index}.label`) || `item ${index + 1}`;
          return (
            <li key={field.id} className={`border-line border-b pb-3 md:border-0 md:pb-0 ${GRID}`}>
              <TextField
                name={`sheet.masses.${index}.label`}
                label="Item"
                underHead
                className="col-span-3 md:col-span-1"
              />
              <NumberField name={`sheet.masses.${index}.kg`} label="Mass" unit="kg" underHead />
              <NumberField name={`sheet.masses.${index}.yM`} label="y" unit="m" underHead />
              <NumberField name={`sheet.masses.${index}.zM`} label="z" unit="m" underHead />
              <SelectField
                name={`sheet.masses.${index}.kind`}
                label="Kind"
                underHead
                className="col-span-2 self-end md:col-span-1 md:self-start"
              >
                {massKinds.map((kind) => (
                  <option key={kind}>{kind}</option>
                ))}
              </SelectField>
              <div className="col-span-3 md:col-span-1">
                <RowButtons path="sheet.masses" index={index} count={fields.length} name={name} {...rows} />
              </div>
            </li>
          );
        })}
      </ol>
      <RowsFoot path="sheet.masses" addLabel="Add an item" add={() => append({ ...emptyMass })} {...rows} />
    </Panel>
  );
}
