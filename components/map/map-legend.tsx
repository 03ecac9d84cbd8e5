import type { ReactNode } from 'react';
import { STATE_WORDS } from '@/components/charts/state-words';
import type { CheckState } from '@/lib/passages/passage';
import { LineSample } from './line-sample';
import { MarkIcon } from './mark-icon';
import type { MapPalette } from './map-palette';
import type { MarkName } from './marks';

const STATES: readonly CheckState[] = ['within', 'thin', 'beyond', 'unknown'];
const MARK_WORDS: readonly (readonly [MarkName, string])[] = [
  ['shunt', 'shunt'],
  ['reef-call', 'reef call'],
  ['flag-danger', 'danger: see the leg’s reasons'],
  ['flag-caution', 'caution: see the leg’s reasons'],
  ['flag-land', 'land on the track'],
];

function Entry({ drawing, words }: { readonly drawing: ReactNode; readonly words: string }) {
  return (
    <li className="map-legend-entry">
      <span className="map-legend-drawing">{drawing}</span>
      {words}
    </li>
  );
}

/** What lines and marks mean, in words; folded away until asked for. */
export function MapLegend({ palette }: { readonly palette: MapPalette }) {
  return (
    <details className="map-legend">
      <summary>Legend</summary>
      <ul>
        <Entry drawing={<LineSample palette={palette} end="A" />} words="end A leads: whole line with ticks" />
        <Entry drawing={<LineSample palette={palette} end="B" />} words="end B leads: long dashes" />
        {STATES.map((state) => (
          <Entry
            key={state}
            drawing={
              <>
                <LineSample palette={palette} end="A" state={state} />
                <MarkIcon name={`state-${state}`} palette={palette} />
              </>
            }
            words={STATE_WORDS[state]}
          />
        ))}
        {MARK_WORDS.map(([name, words]) => (
          <Entry key={name} drawing={<MarkIcon name={name} palette={palette} />} words={words} />
        ))}
      </ul>
      <p>Dots: the line planned. Ruled ground: nothing is known there.</p>
    </details>
  );
}
