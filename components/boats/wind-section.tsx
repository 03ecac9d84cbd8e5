'use client';

import { useFormContext } from 'react-hook-form';
import { readNumber } from '@/components/passages/read-number';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { Panel } from '@/components/ui/panel';
import { CheckField, ChoiceField, GroupProblem, NumberField } from './form-fields';
import type { SheetForm } from './sheet-form';

const MARGINS = [
  { value: '1.5', words: '1.5, the common default' },
  { value: '2.04', words: '2.04, reef at 70 % of the wind that lifts the ama' },
] as const;

/** How wind becomes a moment, and how much room is kept. */
export function WindSection() {
  const { watch, setValue } = useFormContext<SheetForm>();
  const [kind, gust, fromWaterline] = watch(['sheet.pressureKind', 'sheet.gustFactor', 'sheet.fromWaterline']);
  const twice = kind === 'rule' && readNumber(gust) > 1;
  return (
    <Panel title="Wind and margins">
      <div className="space-y-6">
        <div>
          <ChoiceField
            name="sheet.pressureKind"
            legend="Pressure on the sail"
            choices={[
              { value: 'coefficient', label: 'a coefficient C' },
              { value: 'rule', label: 'the shed’s rule, kg/m² at a wind' },
            ]}
          />
          <GroupProblem path="sheet.pressure" />
          <div className="mt-2 grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
            {kind === 'coefficient' ? (
              <NumberField
                name="sheet.pressure.coefficient"
                label="Coefficient C"
                hint="1.4 is a common default; 1.2 to 1.6 are in use."
              />
            ) : (
              <>
                <NumberField name="sheet.pressure.kgPerM2" label="Pressure" unit="kg/m²" />
                <NumberField name="sheet.pressure.atKn" label="At a wind of" unit="kn" />
              </>
            )}
          </div>
          {twice && (
            <div className="mt-3">
              <Notice tone="caution" title="Gusts may be counted twice">
                A rule used in a shed often holds gusts already; the gust factor comes on top. If yours does, set the
                gust factor to 1.
              </Notice>
            </div>
          )}
        </div>
        <div className="grid gap-4 sm:grid-cols-2 lg:grid-cols-3">
          <NumberField
            name="sheet.gustFactor"
            label="Gust factor"
            unit="×"
            hint="Gust over mean where a forecast gives none. 1.35 is a common default; warned days 1.5."
          />
          <NumberField
            name="sheet.windHeightExponent"
            label="Wind height exponent"
            hint="0, the safer habit, takes the forecast’s wind as it is; 0.11 over water lowers it toward the deck."
          />
        </div>
        <div>
          <NumberField
            name="sheet.workingMargin"
            label="Working margin"
            unit="×"
            hint="Kept between heeling moment in the gust and righting moment; 1 or more."
            className="max-w-xs"
          />
          <div className="mt-2 flex flex-wrap gap-2">
            {MARGINS.map(({ value, words }) => (
              <Button
                key={value}
                variant="plain"
                onClick={() => setValue('sheet.workingMargin', value, { shouldDirty: true, shouldValidate: true })}
              >
                {words}
              </Button>
            ))}
          </div>
        </div>
        <div>
          <NumberField
            name="sheet.centreOfLateralResistanceM"
            label="Centre of lateral resistance"
            unit="m"
            disabled={fromWaterline}
            hint="Height over the waterline with the board down, so negative. The heeling lever is measured from it: longer, and safer."
            className="max-w-md"
          />
          <CheckField
            name="sheet.fromWaterline"
            label="Measure levers from the waterline instead"
            hint="A habit of the trade. The lever is shorter, so reefs seem to hold more: not the safer choice."
          />
        </div>
      </div>
    </Panel>
  );
}
