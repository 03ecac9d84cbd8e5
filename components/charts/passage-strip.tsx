'use client';

import { useId, useMemo, useState, type PointerEvent } from 'react';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import { StripDrawing } from './passage-strip-drawing';
import { stripLayout } from './passage-strip-layout';
import { stripModel } from './passage-strip-model';
import { readoutAt } from './passage-strip-readout';
import { placeAt } from './place-at';
import { useRoomPx } from './use-room-px';

interface PassageStripProps {
  readonly result: CheckResult;
  readonly plan: PassagePlan;
  readonly gustFactor: number;
  readonly selectedLeg: number | null;
  onSelectLeg?: (index: number) => void;
  /** The place on the map that belongs to the looked-at time; null when the look is over. */
  onFocus?: (place: { readonly lat: number; readonly lon: number } | null) => void;
}

/** The legs laid along time, with wind, reef calls, leading end, shunts, stream and the dark; the same facts stand in the tables. */
export function PassageStrip({ result, plan, gustFactor, selectedLeg, onSelectLeg, onFocus }: PassageStripProps) {
  const [box, roomPx] = useRoomPx(960);
  const titleId = useId();
  const sliderId = useId();
  const [lookMs, setLookMs] = useState<number | null>(null);
  const model = useMemo(() => stripModel(result, plan, gustFactor), [result, plan, gustFactor]);
  const layout = useMemo(() => stripLayout(model, roomPx), [model, roomPx]);
  const { zone } = plan;
  const clock = (ms: number) => formatInZone(ms, zone, 'time');

  const look = (ms: number | null) => {
    const kept = ms === null ? null : Math.min(model.endMs, Math.max(model.startMs, ms));
    setLookMs(kept);
    onFocus?.(kept === null ? null : placeAt(result.legs, kept));
  };
  const onPointer = (event: PointerEvent<SVGSVGElement>) => {
    const left = event.currentTarget.getBoundingClientRect().left;
    look(layout.x.invert(event.clientX - left));
  };
  const lookedAt = lookMs !== null && lookMs >= model.startMs && lookMs <= model.endMs ? lookMs : null;
  const readout = readoutAt(result, plan, gustFactor, lookedAt ?? model.startMs);

  return (
    <figure className="min-w-0">
      <div
        ref={box}
        className="overflow-x-auto overscroll-x-contain"
        tabIndex={0}
        role="region"
        aria-label="The passage strip, scrolls sideways"
      >
        <svg
          width={layout.width}
          height={layout.height}
          role="img"
          aria-labelledby={titleId}
          className="block touch-pan-x tabular-nums select-none"
          onPointerMove={onPointer}
          onPointerDown={onPointer}
          onPointerLeave={(event) => event.pointerType === 'mouse' && look(null)}
        >
          <title id={titleId}>{describeStrip(model, clock, zone)}</title>
          <StripDrawing model={model} layout={layout} zone={zone} selectedLeg={selectedLeg} onSelectLeg={onSelectLeg} />
          {lookedAt !== null && (
            <line
              x1={layout.x(lookedAt)}
              x2={layout.x(lookedAt)}
              y1={2}
              y2={layout.axisTop}
              className="stroke-ink"
              strokeWidth={1.5}
            />
          )}
        </svg>
      </div>
      <div className="mt-2 flex flex-wrap items-center gap-x-4 gap-y-1 text-sm">
        <label htmlFor={sliderId} className="text-muted">
          Look along the passage
        </label>
        <input
          id={sliderId}
          type="range"
          className="accent-spruce min-h-11 min-w-40 flex-1"
          min={model.startMs}
          max={model.endMs}
          step={60_000}
          value={lookedAt ?? model.startMs}
          aria-valuetext={readout}
          onChange={(event) => look(Number(event.target.value))}
        />
        <output className="basis-full tabular-nums" htmlFor={sliderId}>
          {readout}
        </output>
      </div>
      <figcaption className="text-muted mt-1 text-xs">
        Times in {zone} ({formatInZone(model.startMs, zone, 'zone')}). Solid line of the wind: mean; broken: gust.
        Leading end: solid A, broken B; a tick is a shunt.{' '}
        {model.stream === null && 'No stream entered: the check leaves it out.'}
      </figcaption>
    </figure>
  );
}

function describeStrip(model: ReturnType<typeof stripModel>, clock: (ms: number) => string, zone: string): string {
  return (
    `Passage strip from ${clock(model.startMs)} to ${clock(model.endMs)}, ${zone}: ${model.legs.length} legs, ` +
    `${model.calls.length} reef calls, ${model.shunts.length} shunts, wind up to ${Math.round(model.topKn)} kn in the gusts. ` +
    'The tables give the same facts.'
  );
}
