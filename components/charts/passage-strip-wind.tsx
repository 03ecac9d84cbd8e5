import type { StripLayout } from './passage-strip-layout';
import { LANES } from './passage-strip-layout';
import type { StripModel } from './passage-strip-model';

/** The band between mean and gust, with its scale in knots; hatched where the wind is not known. */
export function StripWindBand({ model, layout }: { readonly model: StripModel; readonly layout: StripLayout }) {
  const { x, y, width } = layout;
  const path = (points: readonly (readonly [number, number])[]) =>
    points.map(([px, py], i) => `${i === 0 ? 'M' : 'L'}${px.toFixed(1)} ${py.toFixed(1)}`).join('');
  return (
    <g>
      {y.ticks(4).map((kn) => (
        <g key={kn}>
          <line x1={LANES.left} x2={width - LANES.right} y1={y(kn)} y2={y(kn)} className="stroke-line" />
          <text x={LANES.left - 8} y={y(kn) + 4} textAnchor="end" className="fill-muted text-[11px]">
            {kn} kn
          </text>
        </g>
      ))}
      {model.wind.map((piece) => {
        const mean = piece.map((one) => [x(one.ms), y(one.meanKn)] as const);
        const gust = piece.map((one) => [x(one.ms), y(one.gustKn)] as const);
        return (
          <g key={piece[0]!.ms}>
            <path d={`${path([...mean, ...[...gust].reverse()])}Z`} className="fill-spruce/15" />
            <path d={path(mean)} className="stroke-ink fill-none" strokeWidth={2} />
            <path d={path(gust)} className="stroke-spruce fill-none" strokeWidth={1.5} strokeDasharray="5 3" />
          </g>
        );
      })}
      {model.windGaps
        .filter((gap) => model.unknownFromMs === null || gap.startMs < model.unknownFromMs - 1)
        .map((gap) => (
          <g key={gap.startMs}>
            <rect
              x={x(gap.startMs)}
              y={LANES.wind.top}
              width={Math.max(2, x(gap.endMs) - x(gap.startMs))}
              height={LANES.wind.height}
              fill="url(#strip-hatch)"
            />
            <text x={x(gap.startMs) + 6} y={LANES.wind.top + 16} className="fill-unknown text-[11px]">
              wind not known
            </text>
          </g>
        ))}
    </g>
  );
}
