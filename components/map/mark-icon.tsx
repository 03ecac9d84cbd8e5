import type { MapPalette } from './map-palette';
import { type MarkName, markStrokes } from './marks';

/** A map mark for the legend, from the same paths as on the map. */
export function MarkIcon({ name, palette }: { readonly name: MarkName; readonly palette: MapPalette }) {
  return (
    <svg viewBox="0 0 24 24" width="22" height="22" aria-hidden="true">
      {markStrokes(name, palette).map(({ path, fill, stroke, width }) => (
        <path key={path + width} d={path} fill={fill ?? 'none'} stroke={stroke ?? 'none'} strokeWidth={width} />
      ))}
    </svg>
  );
}
