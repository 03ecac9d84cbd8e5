import type { ReactNode } from 'react';
import { Caution } from '@/components/charts/caution';
import { Notice } from '@/components/ui/notice';
import { Panel } from '@/components/ui/panel';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import { AbackPanel } from './aback-panel';
import { boatFigures } from './boat-figures';
import { HabitsPanel } from './habits-panel';
import { HeelingBench } from './heeling-bench';
import { MassesTable } from './masses-table';
import { MeasuresPanel } from './measures-panel';
import { PolarTable } from './polar-table';
import { ReefTable } from './reef-table';
import { RightingPanel } from './righting-panel';
import { sheetFindings } from './sheet-findings';

interface SheetReadingProps {
  readonly sheet: BoatSheet;
  /** Stands at the end: versions, members. */
  readonly children?: ReactNode;
}

/** One version of the boat sheet, to be read: what she holds, and everything it is worked from. */
export function SheetReading({ sheet, children }: SheetReadingProps) {
  const figures = boatFigures(sheet);
  return (
    <div className="space-y-6">
      {sheetFindings(figures).map(({ severity, title, text }) => (
        <Notice key={title} tone={severity} title={title}>
          {text}
        </Notice>
      ))}
      <RightingPanel figures={figures} />
      <HeelingBench sheet={sheet} />
      <ReefTable figures={figures} />
      <div className="grid gap-6 lg:grid-cols-2">
        <MassesTable figures={figures} />
        <AbackPanel figures={figures} />
        <MeasuresPanel sheet={sheet} />
        <HabitsPanel sheet={sheet} />
        <PolarTable polar={sheet.polar} />
        {sheet.notes && (
          <Panel title="Notes">
            <p className="whitespace-pre-wrap">{sheet.notes}</p>
          </Panel>
        )}
        {children}
      </div>
      <Caution />
    </div>
  );
}
