'use client';

import { useMemo } from 'react';
import { ReefCallList } from '@/components/reef-calls/reef-call-list';
import type { CheckResult } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { LegCards } from './leg-cards';
import { legFacts } from './leg-facts';
import { LightLine } from './light-line';
import { LegsTable } from './legs-table';
import { NotebookSection } from './notebook-section';
import { Reasons } from './reasons';
import { Totals } from './totals';
import { Working } from './working';

export interface ResultViewProps {
  readonly result: CheckResult;
  readonly plan: PassagePlan;
  readonly sheet: BoatSheet;
  readonly selectedLeg: number | null;
  onSelectLeg: (index: number) => void;
}

export const RESULT_LINKS = [
  ['strip', 'Passage strip'],
  ['legs', 'Legs'],
  ['reef-calls', 'Reef calls'],
  ['why', 'Why'],
] as const;

/** The result under the verdict: totals, legs, reef calls, reasons, working. */
export function ResultView({ result, plan, sheet, selectedLeg, onSelectLeg }: ResultViewProps) {
  const facts = useMemo(() => legFacts(result, plan, sheet.gustFactor), [result, plan, sheet.gustFactor]);
  const reefNames = sheet.reefs.map((reef) => reef.name);
  const shared = { facts, workingMargin: sheet.workingMargin, selectedLeg, onSelectLeg };
  return (
    <div className="space-y-8">
      <div>
        <Totals result={result} departure={plan.departure} zone={plan.zone} />
        <LightLine start={plan.route[0]!} departure={plan.departure} zone={plan.zone} />
      </div>
      <NotebookSection title="Legs" anchor="legs">
        <LegsTable {...shared} />
        <LegCards {...shared} />
      </NotebookSection>
      <div className="grid gap-8 lg:grid-cols-2">
        <NotebookSection title="Reef calls" anchor="reef-calls">
          <ReefCallList legs={result.legs} plan={plan} reefNames={reefNames} />
        </NotebookSection>
        <NotebookSection title="Why, and what may be done" anchor="why">
          <Reasons result={result} plan={plan} reefNames={reefNames} />
          <div className="mt-4">
            <Working result={result} sheet={sheet} />
          </div>
        </NotebookSection>
      </div>
    </div>
  );
}
