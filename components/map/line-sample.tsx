import type { CheckState } from '@/lib/passages/passage';
import type { MapPalette } from './map-palette';

interface Props {
  readonly palette: MapPalette;
  readonly end: 'A' | 'B';
  readonly state?: CheckState;
}

/** A short piece of track for the legend, drawn as the map draws it. */
export function LineSample({ palette, end, state }: Props) {
  const colour = state ? palette.state[state] : palette.ink;
  const width = state === 'beyond' ? 4 : state === 'unknown' ? 2 : 3;
  return (
    <svg viewBox="0 0 56 22" width="56" height="22" aria-hidden="true">
      <path d="M1 11H55" stroke={colour} strokeWidth={width} strokeDasharray={end === 'B' ? '12 6' : undefined} />
      {end === 'A' && !state && <path d="M7 5V17M21 5V17M35 5V17M49 5V17" stroke={palette.ink} strokeWidth={1.75} />}
      {state === 'thin' && <path d="M1 16.5H55" stroke={colour} strokeWidth={1.5} />}
      {state === 'beyond' && <path d="M1 5.5H55M1 16.5H55" stroke={colour} strokeWidth={1.5} />}
      {state === 'unknown' &&
        [14, 28, 42].map((x) => (
          <circle key={x} cx={x} cy={11} r={4} fill={palette.paper} stroke={colour} strokeWidth={1.75} />
        ))}
    </svg>
  );
}
