import type { CheckState } from '@/lib/passages/passage';

interface BeamProps {
  readonly rightingNm: number;
  readonly heelingNm: number;
  readonly loadShare: number;
  readonly workingMargin: number;
  readonly size?: 'small' | 'large';
}

const ARM = 92;
/** Tips to this when the heeling moment has the upper hand; beyond, it has fallen. */
const FALLEN_DEG = 24;

/**
 * The beam: righting moment on one side, heeling moment on the other, both drawn to one scale as blocks hung from a
 * balance. It lies level while the margin is kept, tips as the load share passes 1/margin, and has fallen at 1.
 */
export function Beam({ rightingNm, heelingNm, loadShare, workingMargin, size = 'small' }: BeamProps) {
  const tipDeg = tilt(loadShare, workingMargin);
  const state: Exclude<CheckState, 'unknown'> = tipDeg === 0 ? 'within' : loadShare > 1 ? 'beyond' : 'thin';
  const largest = Math.max(rightingNm, heelingNm, 1);
  const large = size === 'large';
  return (
    <svg
      viewBox={large ? '-110 -34 220 130' : '-110 -34 220 92'}
      role="img"
      aria-label={label(rightingNm, heelingNm, loadShare, workingMargin)}
      className={`${large ? 'w-full max-w-xl' : 'h-12 w-28'} ${COLOUR[state]}`}
      data-state={state}
      fill="none"
      stroke="currentColor"
    >
      <path d="M-9 46L0 0l9 46Z" fill="currentColor" stroke="none" />
      <g transform={`rotate(${tipDeg})`}>
        <path d={`M${-ARM} 0H${ARM}`} strokeWidth="5" />
        <Block x={-ARM + 22} share={rightingNm / largest} filled={false} />
        <Block x={ARM - 22} share={heelingNm / largest} filled />
        <MarginTick x={ARM - 22} share={rightingNm / workingMargin / largest} />
      </g>
      <path d="M-60 48H60" strokeWidth="2" />
      {large && (
        <g stroke="none" className="fill-ink text-[9px]">
          <text x={-ARM + 22} y="66" textAnchor="middle">
            righting moment
          </text>
          <text x={-ARM + 22} y="78" textAnchor="middle" fontWeight="700">
            {kgM(rightingNm)} kg·m
          </text>
          <text x={ARM - 22} y="66" textAnchor="middle">
            heeling moment
          </text>
          <text x={ARM - 22} y="78" textAnchor="middle" fontWeight="700">
            {kgM(heelingNm)} kg·m
          </text>
          <text x="0" y="66" textAnchor="middle">
            load share
          </text>
          <text x="0" y="78" textAnchor="middle" fontWeight="700">
            {loadShare.toFixed(2)}
          </text>
        </g>
      )}
    </svg>
  );
}

const COLOUR = { within: 'text-within', thin: 'text-thin', beyond: 'text-beyond' } as const;
const TALLEST = 28;

/** A weight standing on the beam, its height the moment; heeling is solid, righting is open. */
function Block({ x, share, filled }: { readonly x: number; readonly share: number; readonly filled: boolean }) {
  const height = Math.max(1, share * TALLEST);
  return (
    <rect
      x={x - 15}
      y={-height - 2.5}
      width="30"
      height={height}
      strokeWidth="2.5"
      fill={filled ? 'currentColor' : 'none'}
    />
  );
}

/** Where the heeling block would reach if the working margin were just used up. */
function MarginTick({ x, share }: { readonly x: number; readonly share: number }) {
  const y = -Math.min(1, share) * TALLEST - 2.5;
  return <path d={`M${x - 24} ${y}H${x - 17}M${x + 17} ${y}H${x + 24}`} strokeWidth="2" />;
}

/** Level up to 1/margin, then in proportion, fallen from 1 on. */
function tilt(loadShare: number, workingMargin: number): number {
  const from = 1 / workingMargin;
  if (loadShare <= from) return 0;
  if (loadShare > 1) return FALLEN_DEG;
  return 4 + ((loadShare - from) / Math.max(1 - from, 1e-9)) * (FALLEN_DEG - 10);
}

const kgM = (momentNm: number) => Math.round(momentNm / 9.80665);

function label(rightingNm: number, heelingNm: number, loadShare: number, workingMargin: number): string {
  return `The beam: heeling moment ${kgM(heelingNm)} kg·m against righting moment ${kgM(rightingNm)} kg·m, load share ${loadShare.toFixed(2)}, working margin ${workingMargin}.`;
}
