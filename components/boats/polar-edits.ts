import type { PolarForm } from './sheet-form';

/** Edits of the polar's grid. Every wind keeps every angle, so no hole appears by itself. */
export type PolarEdit =
  | { readonly kind: 'speed'; readonly wind: number; readonly angle: number; readonly text: string }
  | { readonly kind: 'wind'; readonly wind: number; readonly text: string }
  | { readonly kind: 'angle'; readonly angle: number; readonly text: string }
  | { readonly kind: 'add-wind' | 'add-angle' }
  | { readonly kind: 'remove-wind'; readonly wind: number }
  | { readonly kind: 'remove-angle'; readonly angle: number };

export function editPolar(polar: PolarForm, edit: PolarEdit): PolarForm {
  const { windSpeedsKn, windAnglesDeg, speedsKn } = polar;
  switch (edit.kind) {
    case 'speed':
      return {
        ...polar,
        speedsKn: speedsKn.map((row, wind) => (wind === edit.wind ? put(row, edit.angle, edit.text) : row)),
      };
    case 'wind':
      return { ...polar, windSpeedsKn: put(windSpeedsKn, edit.wind, edit.text) };
    case 'angle':
      return { ...polar, windAnglesDeg: put(windAnglesDeg, edit.angle, edit.text) };
    case 'add-wind':
      return { ...polar, windSpeedsKn: [...windSpeedsKn, ''], speedsKn: [...speedsKn, windAnglesDeg.map(() => '')] };
    case 'add-angle':
      return { ...polar, windAnglesDeg: [...windAnglesDeg, ''], speedsKn: speedsKn.map((row) => [...row, '']) };
    case 'remove-wind':
      return { ...polar, windSpeedsKn: without(windSpeedsKn, edit.wind), speedsKn: without(speedsKn, edit.wind) };
    case 'remove-angle':
      return {
        ...polar,
        windAnglesDeg: without(windAnglesDeg, edit.angle),
        speedsKn: speedsKn.map((row) => without(row, edit.angle)),
      };
  }
}

function put(list: readonly string[], at: number, text: string): string[] {
  return list.map((value, index) => (index === at ? text : value));
}

function without<Item>(list: readonly Item[], at: number): Item[] {
  return list.filter((_, index) => index !== at);
}
