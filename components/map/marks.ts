import type { MapPalette } from './map-palette';

type Colour = (palette: MapPalette) => string;

interface Stroke {
  /** SVG path on a 24 × 24 ground. */
  readonly path: string;
  readonly fill?: Colour;
  readonly stroke?: Colour;
  readonly width?: number;
}

const ink: Colour = (palette) => palette.ink;
const paper: Colour = (palette) => palette.paper;
const spruce: Colour = (palette) => palette.spruce;
const within: Colour = (palette) => palette.state.within;
const thin: Colour = (palette) => palette.state.thin;
const beyond: Colour = (palette) => palette.state.beyond;
const unknown: Colour = (palette) => palette.state.unknown;

/** The card a state's mark lies on: square-cut, ruled in the state's colour. */
const card = (colour: Colour): Stroke => ({ path: 'M1.5 1.5H22.5V22.5H1.5Z', fill: paper, stroke: colour, width: 1.5 });
const DIAMOND = 'M12 2.5L21.5 12L12 21.5L2.5 12Z';
const CHEVRONS = 'M8.5 5.5L3 12L8.5 18.5M15.5 5.5L21 12L15.5 18.5';

/** Every mark on the map and in its legend, drawn from the same paths in both. */
export const MARKS = {
  'state-within': [
    card(within),
    { path: 'M4.5 10H19.5', stroke: within, width: 2.5 },
    { path: 'M12 11L8.5 18.5H15.5Z', fill: within },
  ],
  'state-thin': [
    card(thin),
    { path: 'M4.5 7L19.5 13', stroke: thin, width: 2.5 },
    { path: 'M12 11L8.5 18.5H15.5Z', fill: thin },
  ],
  'state-beyond': [
    card(beyond),
    { path: 'M6.5 4L17.5 19', stroke: beyond, width: 2.5 },
    { path: 'M8.5 11L5 18.5H12Z', fill: beyond },
  ],
  'state-unknown': [card(unknown), { path: 'M12 6a6 6 0 1 1 0 12a6 6 0 1 1 0-12Z', stroke: unknown, width: 2.25 }],
  'end-a-tick': [{ path: 'M12 6V18', stroke: ink, width: 1.75 }],
  'ring-unknown': [{ path: 'M12 8a4 4 0 1 1 0 8a4 4 0 1 1 0-8Z', fill: paper, stroke: unknown, width: 1.75 }],
  shunt: [
    { path: CHEVRONS, stroke: paper, width: 5 },
    { path: CHEVRONS, stroke: ink, width: 2.25 },
  ],
  'reef-call': [
    { path: 'M5 3.5H14L19.5 20.5H5Z', fill: paper, stroke: spruce, width: 1.75 },
    { path: 'M5 11.5H16.5M8 11.5V14.5M11.5 11.5V14.5M15 11.5V14.5', stroke: spruce, width: 1.5 },
  ],
  'flag-danger': [
    { path: DIAMOND, fill: beyond, stroke: paper, width: 1.25 },
    { path: 'M12 7V13M12 15.5V17.5', stroke: paper, width: 2.25 },
  ],
  'flag-caution': [
    { path: DIAMOND, fill: paper, stroke: thin, width: 1.75 },
    { path: 'M12 7V13M12 15.5V17.5', stroke: thin, width: 2.25 },
  ],
  'flag-land': [
    { path: DIAMOND, fill: paper, stroke: beyond, width: 1.75 },
    { path: 'M8 16.5L16.5 8M7 13L13 7M11 17L17 11', stroke: beyond, width: 1.5 },
  ],
  focus: [
    { path: 'M12 4a8 8 0 1 1 0 16a8 8 0 1 1 0-16Z', stroke: paper, width: 4 },
    { path: 'M12 4a8 8 0 1 1 0 16a8 8 0 1 1 0-16ZM12 0.5V6M12 18V23.5M0.5 12H6M18 12H23.5', stroke: spruce, width: 2 },
  ],
  town: [{ path: 'M9.5 9.5H14.5V14.5H9.5Z', fill: paper, stroke: (palette) => palette.landText, width: 1.5 }],
} satisfies Readonly<Record<string, readonly Stroke[]>>;

export type MarkName = keyof typeof MARKS;

/** A mark's strokes with its colours filled in. */
export function markStrokes(
  name: MarkName,
  palette: MapPalette,
): readonly { path: string; fill?: string; stroke?: string; width: number }[] {
  const strokes: readonly Stroke[] = MARKS[name];
  return strokes.map(({ path, fill, stroke, width }) => ({
    path,
    width: width ?? 1,
    ...(fill && { fill: fill(palette) }),
    ...(stroke && { stroke: stroke(palette) }),
  }));
}
