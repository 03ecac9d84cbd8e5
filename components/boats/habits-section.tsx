'use client';

import { useFormContext } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { ChoiceField, GroupProblem, NumberField } from './form-fields';
import { RowButtons } from './row-buttons';
import { RowsFoot } from './rows-foot';
import { emptyLeeway, type SheetForm } from './sheet-form';
import { useRows } from './use-rows';

/** Angles, leeway and shunts. */
export function HabitsSection() {
  const { watch } = useFormContext<SheetForm>();
  const leewayKind = watch('sheet.leewayKind');
  return (
    <Panel title="Angles, leeway and shunts">
      <div className="space-y-6">
        <div className="grid gap-4 sm:grid-cols-2">
          <NumberField
            name="sheet.closestAngleDeg"
            label="Closest angle to the wind"
            unit="°"
            hint="Left empty: the polar’s best speed made good. With a board 52–60°, without 60–75° are common defaults."
          />
          <NumberField
            name="sheet.deepestAngleDeg"
            label="Deepest angle"
            unit="°"
            hint="Left empty: the polar’s best, never over 150°. Deeper, one shift can put her aback; 145–155° is a common limit."
          />
        </div>
        <div>
          <ChoiceField
            name="sheet.leewayKind"
            legend="Leeway"
            choices={[
              { value: 'one', label: 'one for all angles' },
              { value: 'byAngle', label: 'by wind angle' },
            ]}
          />
          {leewayKind === 'one' ? (
            <NumberField
              name="sheet.leewayOne"
              label="Leeway at all angles"
              unit="°"
              hint="With a board 4–8°, without 10–20° are common defaults."
              className="mt-2 max-w-xs"
            />
          ) : (
            <LeewayRows />
          )}
        </div>
        <div className="grid gap-4 sm:grid-cols-2">
          <NumberField
            name="sheet.shunt.seconds"
            label="A shunt takes"
            unit="s"
            hint="Common defaults: schooner, ballestron or lug 30; crab claw with two 45; alone or rough 75."
          />
          <NumberField
            name="sheet.shunt.driftKn"
            label="Drift while stopped"
            unit="kn"
            hint="Down the wind, through the water. 0.8 to 1.5 are common; time her over a mark."
          />
        </div>
      </div>
    </Panel>
  );
}

function LeewayRows() {
  const { fields, append, ...rows } = useRows('sheet.leewayDeg');
  return (
    <div className="mt-2">
      <GroupProblem path="sheet.leewayDeg" />
      <ol className="space-y-3">
        {fields.map((field, index) => (
          <li key={field.id} className="grid grid-cols-2 items-end gap-3 sm:grid-cols-[10rem_10rem_auto]">
            <NumberField name={`sheet.leewayDeg.${index}.angleDeg`} label="Wind angle" unit="°" />
            <NumberField name={`sheet.leewayDeg.${index}.leewayDeg`} label="Leeway" unit="°" />
            <RowButtons
              path="sheet.leewayDeg"
              index={index}
              count={fields.length}
              name={`row ${index + 1}`}
              {...rows}
            />
          </li>
        ))}
      </ol>
      <RowsFoot path="sheet.leewayDeg" addLabel="Add an angle" add={() => append({ ...emptyLeeway })} {...rows} />
    </div>
  );
}
