import { BEAM_FALLEN_DEG, beamTiltDeg } from '@/components/charts/beam-tilt';
import { STATE_WORDS } from '@/components/charts/state-words';
import type { CheckState } from '@/lib/passages/passage';
import { GRAVITY_M_S2 } from '@/lib/units/constants';

interface BeamProps {
  readonly rightingNm: number;
  readonly heelingNm: number;
  readonly loadShare: number;
  readonly workingMargin: number;
  /** Where more is known than the load share says: a carry-up-to passed, no heel that balances. */
  readonly state?: Exclude<CheckState, 'unknown'>;
  readonly size?: 'small' | 'large';
}

/** Length of the longer arm, in the drawing's own units. */
const ARM = 92;
const HALF = 6;

/**
 * The beam: the righting arm (open) on one side of a balance and the heeling arm (solid) on the other, their lengths
 * the moments, to one scale. A notch on the heeling side stands where the working margin is used up, a dashed arm
 * behind it where righting moment itself is. Level while the margin is kept, tipping past it, fallen over it: told
 * apart by shape and word, not by colour.
 */
export function Beam({ rightingNm, heelingNm, loadShare, workingMargin, state: given, size = 'small' }: BeamProps) {
  const state = given ?? stateOf(loadShare, workingMargin);
  const tiltDeg =
    state === 'beyond' ? BEAM_FALLEN_DEG : Math.max(state === 'thin' ? 4 : 0, beamTiltDeg(loadShare, workingMargin));
  const large = size === 'large';
  return (
    <svg
      viewBox={large ? '-112 -46 224 136' : '-100 -42 200 92'}
      role="img"
      aria-label={labelOf({ rightingNm, heelingNm, loadShare, workingMargin }, STATE_WORDS[state])}
      className={`${large ? 'w-full max-w-md' : 'h-12 w-26 shrink-0'} ${COLOUR[state]}`}
      data-state={state}
      fill="none"
      stroke="currentColor"
      strokeWidth={large ? 2 : 3.5}
    >
      <path d="M-11 44L0 2l11 42Z" fill="currentColor" stroke="none" />
      <path d="M-96 45H96" />
      <Arms rightingNm={rightingNm} heelingNm={heelingNm} workingMargin={workingMargin} tiltDeg={tiltDeg} />
      {large && (
        <g stroke="none" className="fill-ink text-[9.5px]">
          <Figure x={-72} what="righting moment" figure={`${kgM(rightingNm)} kg·m`} />
          <Figure x={0} what="load share" figure={loadShare.toFixed(2)} />
          <Figure x={72} what="heeling moment" figure={`${kgM(heelingNm)} kg·m`} />
        </g>
      )}
    </svg>
  );
}

const COLOUR = { within: 'text-within', thin: 'text-thin', beyond: 'text-beyond' } as const;

type ArmsProps = Pick<BeamProps, 'rightingNm' | 'heelingNm' | 'workingMargin'> & { readonly tiltDeg: number };

function Arms({ rightingNm, heelingNm, workingMargin, tiltDeg }: ArmsProps) {
  const perNm = ARM / Math.max(rightingNm, heelingNm, 1);
  const righting = rightingNm * perNm;
  const heeling = heelingNm * perNm;
  const notch = righting / workingMargin;
  return (
    <g transform={`rotate(${tiltDeg})`}>
      <rect x={-righting} y={-HALF} width={righting} height={2 * HALF} data-arm="righting" />
      {heeling < righting && (
        <rect
          x={heeling}
          y={-HALF}
          width={righting - heeling}
          height={2 * HALF}
          strokeDasharray="3 4"
          strokeWidth="1.5"
        />
      )}
      <rect x="0" y={-HALF} width={heeling} height={2 * HALF} fill="currentColor" data-arm="heeling" />
      <path d={`M${notch} ${-HALF - 9}v8M${notch} ${HALF + 9}v-8`} data-notch="" />
    </g>
  );
}

function Figure({ x, what, figure }: { readonly x: number; readonly what: string; readonly figure: string }) {
  return (
    <>
      <text x={x} y="63" textAnchor="middle">
        {what}
      </text>
      <text x={x} y="78" textAnchor="middle" fontWeight="700" fontSize="12">
        {figure}
      </text>
    </>
  );
}

function stateOf(loadShare: number, workingMargin: number): Exclude<CheckState, 'unknown'> {
  if (loadShare > 1) return 'beyond';
  return beamTiltDeg(loadShare, workingMargin) > 0 ? 'thin' : 'within';
}

const kgM = (momentNm: number) => Math.round(momentNm / GRAVITY_M_S2);

function labelOf({ rightingNm, heelingNm, loadShare, workingMargin }: BeamProps, word: string): string {
  return `The beam, ${word}: heeling moment ${kgM(heelingNm)} kg·m against righting moment ${kgM(rightingNm)} kg·m, load share ${loadShare.toFixed(2)}, working margin ${workingMargin}.`;
}
