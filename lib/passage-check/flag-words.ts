import { OLD_FORECAST_H } from '@/lib/passages/flags/forecast-flags';
import type { FlagCode } from '@/lib/passages/passage';

type Numbers = Readonly<Record<string, number>>;

interface FlagWords {
  /** The finding with its numbers, without leg, time and place. */
  says(numbers: Numbers, reef: string): string;
  readonly remedy: string;
}

const kn = (value: number | undefined) => `${value === undefined ? '?' : Math.round(value)} kn`;
const minutes = (value: number | undefined) => {
  const whole = Math.round(value ?? 0);
  return whole >= 90 ? `${(whole / 60).toFixed(1)} h` : `${whole} min`;
};
const times = (value: number | undefined) => (value === undefined ? '?' : value.toFixed(2));
const load = (n: Numbers, reef: string) =>
  `gust ${kn(n.gustKn)} gives ${times(n.loadShare)} × her righting moment with “${reef}”` +
  (n.loadShareAtRest !== undefined && n.loadShareAtRest >= (n.loadShare ?? 0) ? ', beam-on at rest' : '');

/** Every flag in words. What may be done is never advice to go. */
export const FLAG_WORDS: Record<FlagCode, FlagWords> = {
  'beyond-righting-moment': {
    says: (n, reef) => `${load(n, reef)}: heeling moment beats righting moment`,
    remedy:
      'Do not count on sailing this. Another departure, a way with more shelter, or more righting moment to windward may change it.',
  },
  'little-margin': {
    says: (n, reef) =>
      `${load(n, reef)}, inside your working margin of ${times(n.workingMargin)} for ${minutes(n.minutes)}`,
    remedy:
      'Put crew or ballast to windward, carry a smaller sail from the start, or choose a departure with less gust.',
  },
  'carry-up-to-exceeded': {
    says: (n, reef) =>
      `mean ${kn(n.meanKn)}, gust ${kn(n.gustKn)} is over what you carry “${reef}” up to, and there is no less sail`,
    remedy: 'Your own experience says no. Wait, or carry less sail than the reef table has.',
  },
  'carry-above-holds': {
    says: () => 'a reef is carried up to more wind than it holds',
    remedy: 'Open the boat sheet and set the two right.',
  },
  'cannot-be-sailed': {
    says: (n) =>
      `she makes good nothing for ${minutes(n.minutes)}, with ${kn(n.meanKn)} of wind, and drifts with the stream`,
    remedy: 'Leave when the stream has turned or there is wind; look what lies down the drift.',
  },
  'no-room': {
    says: () =>
      'no room to work in boards: a crossing of the corridor takes less than two shunts, or a pair of boards gains nothing',
    remedy: 'Widen the corridor if there is clear water, or wait for a wind that lets her sail it direct.',
  },
  'after-dark': {
    says: (n) => `it is dark, for ${minutes(n.minutes)}`,
    remedy: 'Leave earlier, or plan lights, watches and more sea room.',
  },
  'forecast-old': {
    says: (n) =>
      `the forecast is ${(n.ageHours ?? 0).toFixed(1)} h old, over ${OLD_FORECAST_H} h: its verdict is not known`,
    remedy: 'Get the newest forecast and put it in.',
  },
  'forecast-age-unknown': {
    says: () => 'the age of the forecast is not known',
    remedy: 'Put in when the forecast was issued.',
  },
  'forecast-over': {
    says: () => 'the forecast ends before she is there: from here on nothing is known',
    remedy: 'Add later rows of wind, or leave earlier.',
  },
  'wind-not-known': {
    says: () => 'the wind is not known: before the first row, or between rows over 90° apart',
    remedy: 'Add rows of wind for this time.',
  },
  'stream-not-known': {
    says: () => 'the stream is not known at this time',
    remedy: 'Add rows of stream for the whole passage, or take the stream out and judge it yourself.',
  },
  'no-stream-given': {
    says: () => 'no stream was given',
    remedy: 'Add rows of stream, or judge it yourself.',
  },
  'never-reached': {
    says: () => 'under 0.2 kn made good for six hours: the rest is not known',
    remedy: 'Choose another departure: more wind, or a stream that helps.',
  },
  'land-on-track': {
    says: () => 'the track meets land',
    remedy: 'Move or add a waypoint, or make the corridor narrower. The sample coast is out by about 100 m.',
  },
  'land-not-checked': {
    says: () => 'outside the chart data: land on the track is not known',
    remedy: 'Lay the track on a proper chart yourself.',
  },
  'many-shunts': {
    says: (n) => `${n.shuntsInAnHour} shunts within an hour`,
    remedy: 'A wider corridor means fewer. Rest the crew before it.',
  },
  'deep-near-aback-limit': {
    says: (n, reef) =>
      `wind at ${Math.round(n.windAngleDeg ?? 0)}° and gust ${kn(n.gustKn)} with “${reef}”, whose aback limit is ${kn(n.abackLimitKn)}`,
    remedy: 'Sail higher in boards, or reef: one shift can bring the wind to the wrong side.',
  },
  'aback-not-known': {
    says: (n) => `wind at ${Math.round(n.windAngleDeg ?? 0)}°, and what she stands aback is not known`,
    remedy: 'Measure the ama’s volume and put it in the boat sheet.',
  },
  'no-curve': {
    says: () => 'no righting curve: heel is not known, the state rests on the load share alone',
    remedy: 'Measure the vaka’s and the ama’s waterplanes and put them in the boat sheet.',
  },
  'rule-may-hold-gusts': {
    says: () => 'the pressure rule may already hold gusts',
    remedy: 'Say in the boat sheet which it is.',
  },
  'over-mean-limit': {
    says: (n) => `mean ${kn(n.meanKn)}, over your limit of ${kn(n.limitKn)}`,
    remedy: 'You set this limit before. Another departure may hold it.',
  },
  'over-gust-limit': {
    says: (n) => `gust ${kn(n.gustKn)}, over your limit of ${kn(n.limitKn)}`,
    remedy: 'You set this limit before. Another departure may hold it.',
  },
  'over-load-share-limit': {
    says: (n) => `load share ${times(n.loadShare)}, over your limit of ${times(n.limit)}`,
    remedy: 'You set this limit before. Less sail or another departure may hold it.',
  },
  'over-shunts-limit': {
    says: (n) => `${n.shuntsInAnHour} shunts within an hour, over your limit of ${n.limit}`,
    remedy: 'You set this limit before. A wider corridor means fewer.',
  },
  'over-hours-limit': {
    says: (n) => `over your limit of ${n.limitH} h`,
    remedy: 'You set this limit before. A refuge on the way splits the passage.',
  },
  'over-dark-limit': {
    says: (n) => `dark for ${minutes(n.minutes)}, and you set no sailing after dark`,
    remedy: 'Leave earlier.',
  },
  'too-long-to-follow': {
    says: () => 'the passage is too long to follow',
    remedy: 'Split it in two.',
  },
};
