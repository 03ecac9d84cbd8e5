import { validateStyleMin } from '@maplibre/maplibre-gl-style-spec';
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { MapCredit } from '@/components/map/map-credit';
import { MapLegend } from '@/components/map/map-legend';
import { MAP_PALETTES } from '@/components/map/map-palette';
import { mapStyle } from '@/components/map/map-style';

afterEach(cleanup);

/** Contrast ratio of two colours. WCAG 2.2, "contrast ratio" and "relative luminance". */
function contrast(one: string, other: string): number {
  const luminance = (colour: string) => {
    const [r, g, b] = [1, 3, 5].map((at) => {
      const part = parseInt(colour.slice(at, at + 2), 16) / 255;
      return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
    });
    return 0.2126 * r! + 0.7152 * g! + 0.0722 * b!;
  };
  const [light, dark] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light! + 0.05) / (dark! + 0.05);
}

describe.each(['day', 'night'] as const)('the map by %s', (theme) => {
  const palette = MAP_PALETTES[theme];
  const style = mapStyle(theme, 'https://boat.example.org');

  it('has a style that is well formed', () => {
    expect(validateStyleMin(style)).toEqual([]);
  });

  it('fetches nothing but from its own origin', () => {
    const addresses = JSON.stringify(style).match(/https?:\/\/[^/"]+/g);
    expect(new Set(addresses)).toEqual(new Set(['https://boat.example.org']));
  });

  it('keeps its words readable', () => {
    expect(contrast(palette.ink, palette.paper)).toBeGreaterThan(4.5);
    expect(contrast(palette.landText, palette.land)).toBeGreaterThan(4.5);
    expect(contrast(palette.landText, palette.beyondSheet)).toBeGreaterThan(4.5);
    expect(contrast(palette.waterText, palette.water)).toBeGreaterThan(4.5);
  });

  it('keeps tracks and marks in sight on water and on land', () => {
    for (const colour of [...Object.values(palette.state), palette.spruce, palette.ink]) {
      expect(contrast(colour, palette.water)).toBeGreaterThan(3);
      expect(contrast(colour, palette.land)).toBeGreaterThan(3);
    }
  });
});

describe('the words on the map', () => {
  it('say that it is not for navigation, and whose coastline it is', () => {
    render(<MapCredit />);
    expect(screen.getByTestId('map-credit').textContent).toBe(
      'Sample chart: not for navigation. Coastline: GSHHG 2.3.7, P. Wessel & W. H. F. Smith (LGPL-3.0-or-later)',
    );
  });

  it('name every state, both ends and every mark', () => {
    render(<MapLegend palette={MAP_PALETTES.day} />);
    for (const words of [
      'within limits',
      'little margin',
      'beyond righting moment',
      'not known',
      /^end A leads/,
      /^end B leads/,
      'shunt',
      'reef call',
      'land on the track',
    ]) {
      expect(screen.getByText(words)).toBeTruthy();
    }
  });
});
