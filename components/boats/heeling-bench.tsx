'use client';

import { useMemo, useState } from 'react';
import { readNumber } from '@/components/passages/read-number';
import { NumberInput, SelectInput } from '@/components/ui/field';
import { Panel } from '@/components/ui/panel';
import { prepareBoat } from '@/lib/passages/prepared-boat';
import { sailedAnglesDeg } from '@/lib/passages/reef-holds';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { benchLoad } from './heeling-bench-load';
import { HeelingLarge } from './heeling-large';
import { HeelingTable } from './heeling-table';
import { figure } from './show';

const MOST_KN = 80;

/** Heeling moment of every reef in a wind of one's choice, against righting moment. */
export function HeelingBench({ sheet }: { readonly sheet: BoatSheet }) {
  const [typedKn, setTypedKn] = useState(String(sheet.reefs[0]?.carryUpToMeanKn ?? 12));
  const [angle, setAngle] = useState('90');
  const [reefIndex, setReefIndex] = useState(0);
  const prepared = useMemo(() => prepareBoat(sheet), [sheet]);
  const meanKn = readNumber(typedKn);
  const readable = meanKn > 0 && meanKn <= MOST_KN;
  const angleDeg = angle === 'rest' ? null : Number(angle);
  const loads = readable
    ? sheet.reefs.map((reef) => ({ reef, load: benchLoad(prepared, reef, meanKn, angleDeg) }))
    : [];
  const chosen = loads[reefIndex];
  return (
    <Panel title="Heeling moment in a wind of your choice">
      <div className="mb-4 grid gap-4 sm:grid-cols-3">
        <NumberInput
          label="Mean wind"
          unit="kn"
          value={typedKn}
          onChange={(event) => setTypedKn(event.target.value)}
          problem={readable ? undefined : `Mean wind: give a number over 0, up to ${MOST_KN} kn.`}
          hint={
            readable
              ? `Gust ${figure(meanKn * sheet.gustFactor, 1)} kn: mean × ${figure(sheet.gustFactor, 2)}`
              : undefined
          }
        />
        <SelectInput label="Wind angle" value={angle} onChange={(event) => setAngle(event.target.value)}>
          {sailedChoices(sheet).map((deg) => (
            <option key={deg} value={deg}>
              {figure(deg, 1)}° off the wind
            </option>
          ))}
          <option value="rest">beam-on, no way on</option>
        </SelectInput>
        <SelectInput
          label="Sail on the beam"
          value={reefIndex}
          onChange={(event) => setReefIndex(Number(event.target.value))}
        >
          {sheet.reefs.map((reef, index) => (
            <option key={reef.name} value={index}>
              {reef.name}
            </option>
          ))}
        </SelectInput>
      </div>
      {chosen && <HeelingLarge sheet={sheet} reef={chosen.reef} load={chosen.load} />}
      {readable && (
        <HeelingTable loads={loads} workingMargin={sheet.workingMargin} hasCurve={prepared.curve !== null} />
      )}
    </Panel>
  );
}

/** Her closest and deepest angle, beam on, and the tens between. */
function sailedChoices(sheet: BoatSheet): readonly number[] {
  const sailed = sailedAnglesDeg(sheet);
  return sailed.filter((deg, index) => index === 0 || index === sailed.length - 1 || deg % 10 === 0);
}
