'use client';

import { useId, useMemo, useState, type PointerEvent } from 'react';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import { zoneOffsetMinutes } from '@/lib/time/zone-offset';
import { LANES, stripLayout, timeTicks } from './passage-strip-layout';
import { StripDark, StripEnds, StripReefs, StripStream, StripUnknown } from './passage-strip-lanes';
import { StripLegs } from './passage-strip-legs';
import { stripModel } from './passage-strip-model';
import { readoutAt } from './passage-strip-readout';
import { StripWindBand } from './passage-strip-wind';
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
  const layout = stripLayout(model, roomPx);
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
          <defs>
            <pattern id="strip-hatch" width="8" height="8" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
              <line x1="0" y1="0" x2="0" y2="8" className="stroke-unknown" strokeWidth="1.5" strokeOpacity="0.5" />
            </pattern>
          </defs>
          <LaneNames hasStream={model.stream !== null} />
          <StripWindBand model={model} layout={layout} />
          <StripLegs model={model} layout={layout} selectedLeg={selectedLeg} onSelectLeg={onSelectLeg} />
          <StripReefs model={model} layout={layout} clock={clock} />
          <StripEnds model={model} layout={layout} />
          <StripStream model={model} layout={layout} />
          <StripDark model={model} layout={layout} />
          <StripUnknown model={model} layout={layout} />
          <line
            x1={LANES.left}
            x2={layout.width - LANES.right}
            y1={layout.axisTop}
            y2={layout.axisTop}
            className="stroke-ink"
          />
          {timeTicks(model, layout, zoneOffsetMinutes(model.startMs, zone) * 60_000).map((ms) => (
            <g key={ms}>
              <line
                x1={layout.x(ms)}
                x2={layout.x(ms)}
                y1={layout.axisTop}
                y2={layout.axisTop + 5}
                className="stroke-ink"
              />
              <text x={layout.x(ms)} y={layout.axisTop + 19} textAnchor="middle" className="fill-ink text-[11px]">
                {clock(ms)}
              </text>
            </g>
          ))}
          {lookedAt !== null && (
            <line
              x1={layout.x(lookedAt)}
              x2={layout.x(lookedAt)}
              y1={2}
              y2={layout.axisTop}
              className="stroke-beyond"
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

function LaneNames({ hasStream }: { readonly hasStream: boolean }) {
  const names: readonly (readonly [string, number])[] = [
    ['legs', LANES.legs.top + 26],
    ['reefs', LANES.reefs.top + 15],
    ['end', LANES.ends.top + 16],
    ...(hasStream ? [['stream', LANES.stream.top + 18] as const] : []),
  ];
  return names.map(([name, y]) => (
    <text key={name} x={LANES.left - 8} y={y} textAnchor="end" className="fill-muted text-[11px]">
      {name}
    </text>
  ));
}

function describeStrip(model: ReturnType<typeof stripModel>, clock: (ms: number) => string, zone: string): string {
  return (
    `Passage strip from ${clock(model.startMs)} to ${clock(model.endMs)}, ${zone}: ${model.legs.length} legs, ` +
    `${model.calls.length} reef calls, ${model.shunts.length} shunts, wind up to ${Math.round(model.topKn)} kn in the gusts. ` +
    'The tables give the same facts.'
  );
}
