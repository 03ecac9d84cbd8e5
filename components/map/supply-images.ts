import type { Map } from 'maplibre-gl';
import { IMAGE_RATIO, drawImage, imageId } from './draw-image';
import type { MapTheme } from './map-palette';

const THEMES: readonly MapTheme[] = ['day', 'night'];

/** Draws the style's images for a map when they are asked for, each once. */
export function supplyImages(map: Map): void {
  const supply = (id: string) => {
    const image = map.hasImage(id) ? null : drawImage(id);
    if (image) map.addImage(id, image, { pixelRatio: IMAGE_RATIO });
  };
  map.setMissingStyleImageResolver(supply);
  // A background's pattern is never asked for: it is laid in as soon as there is a style.
  map.on('styledata', () => THEMES.forEach((theme) => supply(imageId(theme, 'beyond-rule'))));
}
