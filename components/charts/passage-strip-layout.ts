import { scaleLinear } from 'd3-scale';
import type { StripModel } from './passage-strip-model';

/** Lanes from top to bottom, px. The drawing is as wide as its panel, or wider and scrolled. */
export const LANES = {
  left: 64,
  right: 16,
  legs: { top: 8, height: 44 },
  wind: { top: 64, height: 116 },
  reefs: { top: 192, height: 40 },
  ends: { top: 244, height: 24 },
  stream: { top: 278, height: 30 },
} as const;

/** Least width of an hour and of a leg, px, so that labels on a phone can be read by scrolling. */
const LEAST_HOUR_PX = 78;
const LEAST_PX = 560;

export type StripLayout = ReturnType<typeof stripLayout>;

export function stripLayout(model: StripModel, roomPx: number) {
  const hours = (model.endMs - model.startMs) / 3_600_000;
  const width = Math.max(roomPx, LEAST_PX, LANES.left + LANES.right + hours * LEAST_HOUR_PX);
  const axisTop = model.stream ? LANES.stream.top + LANES.stream.height + 6 : LANES.stream.top;
  const x = scaleLinear([model.startMs, model.endMs], [LANES.left, width - LANES.right]);
  const y = scaleLinear([0, model.topKn], [LANES.wind.top + LANES.wind.height, LANES.wind.top]).nice(4);
  return { width, height: axisTop + 26, axisTop, x, y };
}

const STEPS_H = [0.25, 0.5, 1, 2, 3, 6, 12, 24];

/** Whole hours (or quarters) of the zone's clock, far enough apart for their labels. */
export function timeTicks(model: StripModel, layout: StripLayout, offsetMs: number): number[] {
  const pxPerHour = layout.x(model.startMs + 3_600_000) - layout.x(model.startMs);
  const stepH = STEPS_H.find((step) => step * pxPerHour >= 64) ?? 24;
  const stepMs = stepH * 3_600_000;
  const first = Math.ceil((model.startMs + offsetMs) / stepMs) * stepMs - offsetMs;
  const ticks: number[] = [];
  for (let ms = first; ms <= model.endMs; ms += stepMs) ticks.push(ms);
  return ticks;
}
