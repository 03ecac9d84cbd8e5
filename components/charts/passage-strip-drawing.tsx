import { memo } from 'react';
import { formatInZone } from '@/lib/time/format-in-zone';
import { zoneOffsetMinutes } from '@/lib/time/zone-offset';
import { StripDark, StripEnds, StripReefs, StripStream, StripUnknown } from './passage-strip-lanes';
import { LANES, timeTicks, type StripLayout } from './passage-strip-layout';
import { StripLegs } from './passage-strip-legs';
import type { StripModel } from './passage-strip-model';
import { StripWindBand } from './passage-strip-wind';

interface StripDrawingProps {
  readonly model: StripModel;
  readonly layout: StripLayout;
  readonly zone: string;
  readonly selectedLeg: number | null;
  onSelectLeg?: ((index: number) => void) | undefined;
}

/** All lanes of the strip over its axis of time; drawn again only where the check or the room changes, not at every look. */
export const StripDrawing = memo(function StripDrawing(props: StripDrawingProps) {
  const { model, layout, zone, selectedLeg, onSelectLeg } = props;
  const clock = (ms: number) => formatInZone(ms, zone, 'time');
  return (
    <>
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
    </>
  );
});

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
