import { STATE_WORDS } from './state-words';
import type { StripLayout } from './passage-strip-layout';
import { LANES } from './passage-strip-layout';
import type { StripModel } from './passage-strip-model';

const TONE = {
  within: { edge: 'stroke-within', ink: 'fill-within' },
  thin: { edge: 'stroke-thin', ink: 'fill-thin' },
  beyond: { edge: 'stroke-beyond', ink: 'fill-beyond' },
  unknown: { edge: 'stroke-unknown', ink: 'fill-unknown' },
} as const;

interface StripLegsProps {
  readonly model: StripModel;
  readonly layout: StripLayout;
  readonly selectedLeg: number | null;
  onSelectLeg?: ((index: number) => void) | undefined;
}

/** One box a leg, with its number, its state's mark and, where there is room, its end and the state in words. */
export function StripLegs({ model, layout, selectedLeg, onSelectLeg }: StripLegsProps) {
  const { top, height } = LANES.legs;
  return model.legs.map((leg) => {
    const left = layout.x(leg.startMs);
    const wide = Math.max(3, layout.x(leg.endMs) - left);
    const selected = selectedLeg === leg.index;
    const tone = TONE[leg.state];
    return (
      <g key={leg.index} className="cursor-pointer" onClick={() => onSelectLeg?.(leg.index)}>
        <title>{`Leg ${leg.index + 1}, ${leg.from} to ${leg.to}: ${STATE_WORDS[leg.state]}`}</title>
        <rect
          x={left + 0.5}
          y={top}
          width={wide - 1}
          height={height}
          className={`${selected ? 'fill-spruce/20' : 'fill-panel'} ${tone.edge}`}
          strokeWidth={selected ? 2.5 : 1.5}
          strokeDasharray={leg.state === 'unknown' ? '4 3' : undefined}
        />
        {wide > 40 && <Mark state={leg.state} x={left + 16} y={top + 15} />}
        {wide > 20 && (
          <text x={left + (wide > 40 ? 32 : wide / 2 - 4)} y={top + 19} className="fill-ink text-[12px] font-bold">
            {wide > 70 ? fit(`${leg.index + 1} ${leg.to}`, wide - 38) : leg.index + 1}
          </text>
        )}
        {wide > 70 && (
          <text x={left + 8} y={top + 37} className={`${tone.ink} text-[11px]`}>
            {fit(STATE_WORDS[leg.state], wide - 12)}
          </text>
        )}
      </g>
    );
  });
}

/** Cuts a label to the room it has, at about 6.4 px a letter. */
function fit(text: string, px: number): string {
  const most = Math.floor(px / 6.4);
  return text.length <= most ? text : `${text.slice(0, Math.max(1, most - 1))}…`;
}

/** The four marks drawn small: level beam, tipping beam, fallen beam, open ring. */
function Mark({ state, x, y }: { readonly state: keyof typeof TONE; readonly x: number; readonly y: number }) {
  const tone = TONE[state];
  if (state === 'unknown') return <circle cx={x} cy={y} r={6} className={`fill-none ${tone.edge}`} strokeWidth={2} />;
  const drop = state === 'within' ? 0 : state === 'thin' ? 3.5 : 7;
  return (
    <g className={tone.edge} strokeWidth={2}>
      <line x1={x - 9} x2={x + 9} y1={y - drop} y2={y + drop} />
      <path d={`M${x} ${y} l-4 8 h8 Z`} className={tone.ink} strokeWidth={0} />
    </g>
  );
}
