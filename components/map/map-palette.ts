import type { CheckState } from '@/lib/passages/passage';

export type MapTheme = 'day' | 'night';

/** Colours by what they are for. Text on `paper`, `water` and `land` keeps 4.5 : 1. */
export interface MapPalette {
  readonly beyondSheet: string;
  readonly beyondRule: string;
  readonly water: string;
  readonly shoreWash: string;
  readonly shoreRule: string;
  readonly shore: string;
  readonly land: string;
  readonly hatch: string;
  readonly paper: string;
  readonly ink: string;
  readonly landText: string;
  readonly waterText: string;
  readonly spruce: string;
  readonly state: Readonly<Record<CheckState, string>>;
}

/** Sailcloth water, land hatched in pencil on sawdust grey. */
const DAY: MapPalette = {
  beyondSheet: '#EAE3D6',
  beyondRule: '#D5CBB9',
  water: '#F2F3EE',
  shoreWash: '#E4E5DC',
  shoreRule: '#C9C8BB',
  shore: '#4A443A',
  land: '#E4DCCD',
  hatch: '#B3A793',
  paper: '#FCFAF4',
  ink: '#1E2A2F',
  landText: '#423A2E',
  waterText: '#526066',
  spruce: '#8A5A2B',
  state: { within: '#2C6E5B', thin: '#9A6700', beyond: '#A3243B', unknown: '#5B6470' },
};

/** Near black, lit by dim red and amber, so that eyes keep their night sight. */
const NIGHT: MapPalette = {
  beyondSheet: '#060404',
  beyondRule: '#1E1210',
  water: '#0D0908',
  shoreWash: '#140C0A',
  shoreRule: '#2A1713',
  shore: '#8A4A34',
  land: '#1F120E',
  hatch: '#3A2019',
  paper: '#0A0706',
  ink: '#D9895B',
  landText: '#B5714D',
  waterText: '#AC6C4F',
  spruce: '#E0A04E',
  state: { within: '#C08A4A', thin: '#E0A04E', beyond: '#F0583A', unknown: '#A97A66' },
};

export const MAP_PALETTES: Readonly<Record<MapTheme, MapPalette>> = { day: DAY, night: NIGHT };
