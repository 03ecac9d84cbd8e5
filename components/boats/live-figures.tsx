'use client';

import { useDeferredValue, useMemo } from 'react';
import { useWatch, type Control } from 'react-hook-form';
import { Panel } from '@/components/ui/panel';
import { uprightRightingMomentNm } from '@/lib/rigging/righting-moment';
import { boatSheetSchema } from '@/lib/schemas/boat-sheet';
import { BigFigure } from './big-figure';
import { boatFigures } from './boat-figures';
import { formToSheet } from './form-to-sheet';
import { NotKnown } from './not-known';
import type { SheetForm } from './sheet-form';
import { figure, kgM, limitKn, newtonM, percent } from './show';

/** The main figures of what is typed, while it is typed. */
export function LiveFigures({ control }: { readonly control: Control<SheetForm> }) {
  const typed = useDeferredValue(useWatch({ control, name: 'sheet' }));
  const figures = useMemo(() => {
    const parsed = boatSheetSchema.safeParse(formToSheet(typed));
    return parsed.success ? boatFigures(parsed.data) : null;
  }, [typed]);
  return (
    <Panel title="As typed">
      {figures ? (
        <dl className="space-y-3">
          <BigFigure what="Righting moment by hand" aside={newtonM(uprightRightingMomentNm(figures.sums))}>
            {kgM(uprightRightingMomentNm(figures.sums))}
          </BigFigure>
          <BigFigure what="Ama load at rest" aside={`${percent(figures.amaLoadKg / figures.sums.massKg)} of her mass`}>
            {figure(figures.amaLoadKg)} kg
          </BigFigure>
          {figures.reefs.map(({ reef, holds, carriedTooFar }, index) => (
            <BigFigure
              key={index}
              what={`“${reef.name}” holds up to`}
              aside={carriedTooFar ? <strong className="text-thin">carried beyond it</strong> : undefined}
            >
              {limitKn(holds.worstKn)}
            </BigFigure>
          ))}
        </dl>
      ) : (
        <NotKnown>Her figures are worked as soon as all that they need is typed in.</NotKnown>
      )}
    </Panel>
  );
}
