'use client';

import { useMemo, useState } from 'react';
import { Caution } from '@/components/charts/caution';
import { PassageStrip } from '@/components/charts/passage-strip';
import type { CheckResult } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { EpochMs } from '@/lib/units/quantities';
import { resultAsOfNow } from './as-of-now';
import { CheckOrigin } from './check-origin';
import { createFocusStore } from './focus-store';
import { NotebookSection } from './notebook-section';
import { PlannerMap } from './planner-map';
import { PageLinks } from './page-links';
import { RESULT_LINKS, ResultView } from './result-view';
import { Verdict } from './verdict';

export interface ReadCheck {
  readonly result: CheckResult;
  readonly sheet: BoatSheet;
  readonly sheetNumber: number;
  readonly engineVersion: string;
  readonly checkedAt: Date;
  readonly checkedBy: string;
}

interface PassageReadingProps {
  readonly passage: PassagePlan & { readonly id: string };
  readonly check: ReadCheck | null;
  readonly boat: { readonly id: string; readonly name: string; readonly sheetNumber: number };
  readonly mayWrite: boolean;
  readonly nowMs: EpochMs;
}

/** The stored check to be read: verdict, where it comes from, map and strip, legs, reef calls, reasons. */
export function PassageReading({ passage, check, boat, mayWrite, nowMs }: PassageReadingProps) {
  if (!check) {
    return (
      <div className="space-y-4">
        <p className="border-spruce border-l-2 pl-3" data-testid="no-check">
          Not checked yet:{' '}
          {mayWrite
            ? 'open the planner, put in the track and the wind, and save.'
            : 'the skipper has not saved a plan.'}
        </p>
        <Caution />
      </div>
    );
  }
  return <StoredCheck passage={passage} check={check} boat={boat} nowMs={nowMs} />;
}

type StoredCheckProps = Omit<PassageReadingProps, 'check' | 'mayWrite'> & { readonly check: ReadCheck };

function StoredCheck({ passage, check, boat, nowMs }: StoredCheckProps) {
  const [selectedLeg, setSelectedLeg] = useState<number | null>(null);
  const [focus] = useState(createFocusStore);
  const now = useMemo(
    () => resultAsOfNow(check.result, passage.wind.issuedAt, nowMs),
    [check.result, passage.wind.issuedAt, nowMs],
  );
  const shown = useMemo(
    () => ({ result: now.result, plan: passage, gustFactor: check.sheet.gustFactor }),
    [now.result, passage, check.sheet.gustFactor],
  );
  const waypoints = passage.route.map(({ name, lat, lon }, index) => ({ id: `${index}`, name, lat, lon }));
  const select = { selectedLeg, onSelectLeg: setSelectedLeg };
  return (
    <div className="space-y-8">
      <div>
        <Verdict result={now.result} plan={passage} reefNames={check.sheet.reefs.map((reef) => reef.name)} />
        <CheckOrigin check={check} boat={boat} passage={passage} now={now} nowMs={nowMs} />
        <PageLinks links={RESULT_LINKS} />
      </div>
      <PlannerMap
        waypoints={waypoints}
        corridors={passage.route.slice(1).map((one) => one.corridorHalfWidthM)}
        check={shown}
        focus={focus}
        readOnly
        {...select}
      />
      <NotebookSection title="Passage strip" anchor="strip">
        <PassageStrip {...shown} {...select} onFocus={focus.set} />
      </NotebookSection>
      <ResultView result={now.result} plan={passage} sheet={check.sheet} {...select} />
    </div>
  );
}
