import type { StripLayout } from './passage-strip-layout';
import { LANES } from './passage-strip-layout';
import type { StripModel } from './passage-strip-model';

interface LaneProps {
  readonly model: StripModel;
  readonly layout: StripLayout;
}

/** Reef calls as flags at the time of the call; the name runs on as far as the next one. */
export function StripReefs({ model, layout, clock }: LaneProps & { readonly clock: (ms: number) => string }) {
  const { top, height } = LANES.reefs;
  const { x } = layout;
  return model.calls.map((call, i) => {
    const left = x(Math.max(model.startMs, Date.parse(call.at)));
    const next = model.calls[i + 1];
    const right = x(next ? Date.parse(next.at) : (model.unknownFromMs ?? model.endMs));
    const by = Math.min(x(Date.parse(call.by)), right);
    const most = Math.floor((right - left - 10) / 6.2);
    const name = call.reef.length <= most ? call.reef : `${call.reef.slice(0, Math.max(0, most - 1))}…`;
    return (
      <g key={`${call.at}-${call.reef}`}>
        <title>{`${call.reef}: call at ${clock(Date.parse(call.at))}, by ${clock(Date.parse(call.by))}`}</title>
        <line x1={left} x2={left} y1={top} y2={top + height} className="stroke-spruce" strokeWidth={2} />
        <rect x={left} y={top} width={Math.max(0, right - left - 2)} height={22} className="fill-spruce/15" />
        {by > left + 2 && (
          <line x1={left} x2={by} y1={top + 27} y2={top + 27} className="stroke-spruce" strokeWidth={3} />
        )}
        {most > 2 && (
          <text x={left + 6} y={top + 15} className="fill-ink text-[11px]">
            {name}
          </text>
        )}
        {right - left > 76 && (
          <text x={Math.max(left + 6, by + 4)} y={top + 36} className="fill-muted text-[10px]">
            {`at ${clock(Date.parse(call.at))}`}
          </text>
        )}
      </g>
    );
  });
}

/** Which end leads: a solid line for A, a broken one for B; a tick at every shunt. */
export function StripEnds({ model, layout }: LaneProps) {
  const y = LANES.ends.top + 12;
  const { x } = layout;
  return (
    <g>
      {model.ends.map((span) => (
        <g key={span.startMs}>
          <line
            x1={x(span.startMs)}
            x2={x(span.endMs)}
            y1={y}
            y2={y}
            className="stroke-ink"
            strokeWidth={span.end === 'A' ? 4 : 2.5}
            strokeDasharray={span.end === 'A' ? undefined : '9 5'}
          />
          {x(span.endMs) - x(span.startMs) > 26 && (
            <text
              x={(x(span.startMs) + x(span.endMs)) / 2}
              y={y - 4}
              textAnchor="middle"
              className="fill-ink text-[11px] font-bold"
            >
              {span.end}
            </text>
          )}
        </g>
      ))}
      {model.shunts.map((shunt) => (
        <path
          key={shunt.ms}
          d={`M${x(shunt.ms)} ${y - 10} v20 M${x(shunt.ms) - 4} ${y - 10} h8 M${x(shunt.ms) - 4} ${y + 10} h8`}
          className="stroke-spruce fill-none"
          strokeWidth={2}
        >
          <title>shunt</title>
        </path>
      ))}
    </g>
  );
}

/** The stream each hour: an arrow toward where it sets (north up), and its knots. */
export function StripStream({ model, layout }: LaneProps) {
  const y = LANES.stream.top + 14;
  return (model.stream ?? []).map((one) => (
    <g key={one.ms} transform={`translate(${layout.x(one.ms) + 8} ${y})`}>
      <path
        d="M0 8 V-7 M-4 -2 L0 -8 L4 -2"
        transform={`rotate(${one.towardDeg.toFixed(0)})`}
        className="stroke-ink fill-none"
        strokeWidth={1.5}
      />
      <text x={12} y={4} className="fill-ink text-[11px]">
        {one.kn.toFixed(1)} kn
      </text>
    </g>
  ));
}

/** Dark hours as a shade over everything, named at its start. */
export function StripDark({ model, layout }: LaneProps) {
  return model.dark.map((span) => (
    <g key={span.startMs}>
      <rect
        x={layout.x(span.startMs)}
        y={2}
        width={Math.max(1, layout.x(span.endMs) - layout.x(span.startMs))}
        height={layout.axisTop - 2}
        className="fill-ink/10"
      />
      <text x={layout.x(span.startMs) + 4} y={LANES.wind.top - 2} className="fill-muted text-[10px]">
        dark
      </text>
    </g>
  ));
}

/** The rest of a passage whose arrival is not known. */
export function StripUnknown({ model, layout }: LaneProps) {
  if (model.unknownFromMs === null) return null;
  const left = layout.x(model.unknownFromMs);
  const right = layout.width - LANES.right;
  const middle = (left + right) / 2;
  return (
    <g>
      <rect x={left} y={2} width={right - left} height={layout.axisTop - 2} fill="url(#strip-hatch)" />
      <rect x={middle - 36} y={LANES.wind.top + 36} width={72} height={24} className="fill-ground" />
      <text x={middle} y={LANES.wind.top + 52} textAnchor="middle" className="fill-unknown text-[12px] font-bold">
        not known
      </text>
    </g>
  );
}
