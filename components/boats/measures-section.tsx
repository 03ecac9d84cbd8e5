'use client';

import type { ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { CheckField, GroupProblem, NumberField } from './form-fields';
import type { SheetForm } from './sheet-form';

/** Span, and the hulls' measures as far as they are known. */
export function MeasuresSection() {
  return (
    <Panel title="Measures">
      <div className="space-y-5">
        <NumberField
          name="sheet.spanM"
          label="Span"
          unit="m"
          hint="Between the centrelines of vaka and ama."
          className="max-w-xs"
        />
        <Group
          name="sheet.hasVaka"
          path="sheet.vaka"
          label="I have the vaka’s measures"
          hint="For heel and the righting curve."
        >
          <NumberField name="sheet.vaka.waterplaneLengthM" label="Waterline length" unit="m" />
          <NumberField name="sheet.vaka.waterplaneBeamM" label="Waterline beam" unit="m" />
          <NumberField
            name="sheet.vaka.waterplaneAreaM2"
            label="Waterplane area, if measured"
            unit="m²"
            hint="Left empty: 0.7 · L · b, a common default."
          />
          <NumberField
            name="sheet.vaka.buoyancyHeightM"
            label="Centre of buoyancy"
            unit="m"
            hint="Under the waterline, so zero or negative: about −0.4 of the draught."
          />
        </Group>
        <Group
          name="sheet.hasAma"
          path="sheet.ama"
          label="I have the ama’s measures"
          hint="For lift-off and the reserve aback."
        >
          <NumberField
            name="sheet.ama.volumeL"
            label="Whole volume"
            unit="litres"
            hint="Left empty: the aback limit is not known."
          />
          <NumberField
            name="sheet.ama.waterplaneM2"
            label="Waterplane at rest"
            unit="m²"
            hint="Left empty: the righting curve is not known."
          />
        </Group>
        <Group name="sheet.hasPod" path="sheet.pod" label="She has a lee pod" hint="Worked as a box.">
          <NumberField name="sheet.pod.lengthM" label="Length" unit="m" />
          <NumberField name="sheet.pod.breadthM" label="Breadth" unit="m" />
          <NumberField name="sheet.pod.depthM" label="Depth" unit="m" />
          <NumberField
            name="sheet.pod.offsetM"
            label="Centre to leeward"
            unit="m"
            hint="From the vaka’s centreline, positive."
          />
          <NumberField
            name="sheet.pod.bottomHeightM"
            label="Bottom over the waterline"
            unit="m"
            hint="At the middle of its bottom."
          />
        </Group>
      </div>
    </Panel>
  );
}

interface GroupProps {
  readonly name: 'sheet.hasVaka' | 'sheet.hasAma' | 'sheet.hasPod';
  readonly path: 'sheet.vaka' | 'sheet.ama' | 'sheet.pod';
  readonly label: string;
  readonly hint: string;
  readonly children: ReactNode;
}

/** Measures that may be left out. Switched off, what was typed in them is kept until the page is left. */
function Group({ name, path, label, hint, children }: GroupProps) {
  const { watch } = useFormContext<SheetForm>();
  return (
    <div className="border-line border-t pt-2">
      <CheckField name={name} label={label} hint={hint} />
      <GroupProblem path={path} />
      {watch(name) && <div className="mt-3 grid gap-4 sm:grid-cols-2 lg:grid-cols-3">{children}</div>}
    </div>
  );
}
