'use client';

import { useFormContext } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { GroupProblem, NumberField, TextField } from './form-fields';
import { RowButtons } from './row-buttons';
import { RowsFoot } from './rows-foot';
import { emptyReef, type SheetForm } from './sheet-form';
import { useRows } from './use-rows';

const GRID =
  'grid grid-cols-2 gap-x-3 gap-y-2 md:grid-cols-[minmax(0,1fr)_6rem_6rem_6rem_6rem_6rem_9rem] md:items-start';

/** The reef table as the owner gives it. */
export function ReefsSection() {
  const { watch } = useFormContext<SheetForm>();
  const { fields, append, ...rows } = useRows('sheet.reefs');
  return (
    <Panel title="Reef table">
      <p className="text-muted mb-3 max-w-prose text-sm">
        Full sail first, the least sail last. Carry up to is your own limit from experience; leave it empty where you
        have none. The centre of effort is measured up from the waterline. Speed is the share of the polar’s with this
        sail.
      </p>
      <GroupProblem path="sheet.reefs" />
      <div aria-hidden="true" className={`text-muted mb-1 hidden text-sm font-bold md:grid md:items-end ${GRID}`}>
        <span>Reef</span>
        <span>Area, m²</span>
        <span>Centre, m</span>
        <span>Carry up to, mean kn</span>
        <span>Carry up to, gust kn</span>
        <span>Speed, ×</span>
      </div>
      <ol className="space-y-3 md:space-y-2">
        {fields.map((field, index) => {
          const name = watch(`sheet.reefs.${index}.name`) || `reef ${index + 1}`;
          return (
            <li key={field.id} className={`border-line border-b pb-3 md:border-0 md:pb-0 ${GRID}`}>
              <TextField
                name={`sheet.reefs.${index}.name`}
                label="Reef"
                underHead
                className="col-span-2 md:col-span-1"
              />
              <NumberField name={`sheet.reefs.${index}.areaM2`} label="Area" unit="m²" underHead />
              <NumberField name={`sheet.reefs.${index}.centreHeightM`} label="Centre of effort" unit="m" underHead />
              <NumberField
                name={`sheet.reefs.${index}.carryUpToMeanKn`}
                label="Carry up to, mean"
                unit="kn"
                underHead
              />
              <NumberField
                name={`sheet.reefs.${index}.carryUpToGustKn`}
                label="Carry up to, gust"
                unit="kn"
                underHead
              />
              <NumberField name={`sheet.reefs.${index}.speedFactor`} label="Speed, share of the polar" underHead />
              <div className="self-end">
                <RowButtons path="sheet.reefs" index={index} count={fields.length} name={name} {...rows} />
              </div>
            </li>
          );
        })}
      </ol>
      <RowsFoot path="sheet.reefs" addLabel="Add a reef" add={() => append({ ...emptyReef })} {...rows} />
    </Panel>
  );
}
