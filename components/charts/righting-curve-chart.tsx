'use client';

import { scaleLinear } from 'd3-scale';
import { useRoomPx } from '@/components/charts/use-room-px';
import { GRAVITY_M_S2 } from '@/lib/units/constants';

export interface CurveMark {
  readonly word: string;
  readonly heelDeg: number;
}

interface RightingCurveChartProps {
  /** Heel and righting moment, ascending in heel. */
  readonly points: readonly { readonly heelDeg: number; readonly momentNm: number }[];
  /** The upright lever's moment, for comparison. */
  readonly byHandNm: number;
  readonly marks: readonly CurveMark[];
  /** The same in words, for those who do not see it. */
  readonly label: string;
}

const HEIGHT = 300;
const EDGE = { top: 66, right: 12, bottom: 44, left: 52 };

/** Righting moment by heel in kg·m, with lift-off, touchdown and vanishing angle where the curve has them. */
export function RightingCurveChart({ points, byHandNm, marks, label }: RightingCurveChartProps) {
  const [room, width] = useRoomPx(560);
  const most = Math.max(byHandNm, ...points.map(({ momentNm }) => momentNm)) / GRAVITY_M_S2;
  const x = scaleLinear([0, points[points.length - 1]?.heelDeg ?? 90], [EDGE.left, width - EDGE.right]);
  const y = scaleLinear([0, most], [HEIGHT - EDGE.bottom, EDGE.top]).nice(5);
  const yOf = (momentNm: number) => y(momentNm / GRAVITY_M_S2);
  const path = points.map(({ heelDeg, momentNm }) => `${x(heelDeg).toFixed(1)} ${yOf(momentNm).toFixed(1)}`).join('L');
  const bottom = HEIGHT - EDGE.bottom;
  return (
    <div ref={room} className="min-w-0">
      <svg width={width} height={HEIGHT} role="img" aria-label={label} className="text-ink block text-[13px]">
        {y.ticks(5).map((tick) => (
          <g key={tick}>
            <path d={`M${EDGE.left} ${y(tick)}H${width - EDGE.right}`} className="stroke-line" />
            <text x={EDGE.left - 6} y={y(tick) + 4} textAnchor="end" className="fill-muted">
              {tick}
            </text>
          </g>
        ))}
        {x.ticks(width < 420 ? 4 : 8).map((tick) => (
          <text key={tick} x={x(tick)} y={bottom + 18} textAnchor="middle" className="fill-muted">
            {tick}°
          </text>
        ))}
        <text x={width - EDGE.right} y={HEIGHT - 4} textAnchor="end" className="fill-muted">
          heel, ama rising
        </text>
        <text x="0" y="14" className="fill-muted">
          kg·m
        </text>
        <path
          d={`M${EDGE.left} ${yOf(byHandNm)}H${width - EDGE.right}`}
          className="stroke-spruce"
          strokeDasharray="6 4"
        />
        <text x={width - EDGE.right} y={yOf(byHandNm) - 5} textAnchor="end" className="fill-spruce">
          by hand, upright
        </text>
        <path d={`M${path}`} fill="none" className="stroke-ink" strokeWidth="2.5" strokeLinejoin="round" />
        {marks.map(({ word, heelDeg }, row) => {
          const toLeft = x(heelDeg) > width * 0.55;
          return (
            <g key={word}>
              <path d={`M${x(heelDeg)} ${8 + row * 18}V${bottom}`} className="stroke-muted" strokeDasharray="2 3" />
              <text
                x={x(heelDeg) + (toLeft ? -5 : 5)}
                y={16 + row * 18}
                textAnchor={toLeft ? 'end' : 'start'}
                className="fill-ink"
              >
                {word} {heelDeg.toFixed(1)}°
              </text>
            </g>
          );
        })}
      </svg>
    </div>
  );
}
