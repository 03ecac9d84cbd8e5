import { MAP_PALETTES, type MapPalette, type MapTheme } from './map-palette';
import { MARKS, type MarkName, markStrokes } from './marks';

/** Pixels of an image for one of the page's: sharp on common screens. */
export const IMAGE_RATIO = 3;
const MARK_SIZE = 24;
const HATCH_SIZE = 40;
const RULE_SIZE = 24;

export type ImageName = MarkName | 'land-hatch' | 'beyond-rule';

/** The id of an image in the style: each theme has its own. */
export function imageId(theme: MapTheme, name: ImageName): string {
  return `${theme}/${name}`;
}

/** Draws the image the style asks for by id; null for an id that is not ours. */
export function drawImage(id: string): ImageData | null {
  const [theme, name] = id.split('/');
  if (theme !== 'day' && theme !== 'night') return null;
  const palette = MAP_PALETTES[theme];
  if (name === 'land-hatch') return drawHatch(palette);
  if (name === 'beyond-rule') return drawRule(palette);
  return name && name in MARKS ? drawMark(name as MarkName, palette) : null;
}

function drawOn(size: number, draw: (context: CanvasRenderingContext2D) => void): ImageData | null {
  const canvas = document.createElement('canvas');
  canvas.width = size * IMAGE_RATIO;
  canvas.height = size * IMAGE_RATIO;
  const context = canvas.getContext('2d');
  if (!context) return null;
  context.scale(IMAGE_RATIO, IMAGE_RATIO);
  draw(context);
  return context.getImageData(0, 0, canvas.width, canvas.height);
}

function drawMark(name: MarkName, palette: MapPalette): ImageData | null {
  return drawOn(MARK_SIZE, (context) => {
    for (const { path, fill, stroke, width } of markStrokes(name, palette)) {
      const shape = new Path2D(path);
      if (fill) {
        context.fillStyle = fill;
        context.fill(shape);
      }
      if (stroke) {
        context.strokeStyle = stroke;
        context.lineWidth = width;
        context.stroke(shape);
      }
    }
  });
}

/** Pencil strokes aslant on the land's tint: lines whose weight wavers a little, so that it looks drawn. */
function drawHatch(palette: MapPalette): ImageData | null {
  return drawOn(HATCH_SIZE, (context) => {
    context.fillStyle = palette.land;
    context.fillRect(0, 0, HATCH_SIZE, HATCH_SIZE);
    context.strokeStyle = palette.hatch;
    const weights = [0.7, 0.45, 0.6, 0.35, 0.55];
    const gap = HATCH_SIZE / weights.length;
    for (let line = -weights.length; line < weights.length; line++) {
      context.lineWidth = weights[(line + weights.length) % weights.length]!;
      context.beginPath();
      context.moveTo(line * gap - 1, HATCH_SIZE + 1);
      context.lineTo(line * gap + HATCH_SIZE + 1, -1);
      context.stroke();
    }
  });
}

/** Sparse level rules, as on ruled paper: the sheet has not been drawn here. */
function drawRule(palette: MapPalette): ImageData | null {
  return drawOn(RULE_SIZE, (context) => {
    context.fillStyle = palette.beyondSheet;
    context.fillRect(0, 0, RULE_SIZE, RULE_SIZE);
    context.fillStyle = palette.beyondRule;
    context.fillRect(0, 7, RULE_SIZE, 0.75);
    context.fillRect(0, 19, RULE_SIZE, 0.75);
  });
}
