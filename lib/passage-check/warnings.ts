import { flagAt } from '@/lib/passages/flags/leg-context';
import { forecastAgeH, OLD_FORECAST_H } from '@/lib/passages/flags/forecast-flags';
import type { FollowedPassage } from '@/lib/passages/follow-passage';
import type { CheckResult, Flag, Passage } from '@/lib/passages/passage';
import { reefHolds } from '@/lib/passages/reef-holds';
import type { Hours } from '@/lib/units/quantities';

type Warning = CheckResult['warnings'][number];

/** What is true of the whole passage or of the boat sheet, in words. */
export function passageWarnings(passage: Passage, { prepared }: FollowedPassage, hours: Hours | null): Warning[] {
  return [
    ...forecastWarnings(passage),
    ...boatWarnings(passage, prepared.curve !== null),
    ...carryWarnings(passage),
    ...hoursWarnings(passage, hours),
  ];
}

function warn(flag: Flag, message: string): Warning {
  return { ...flag, message };
}

function forecastWarnings(passage: Passage): Warning[] {
  const ageHours = forecastAgeH(passage);
  if (ageHours === null) {
    const message = 'The forecast has no issue time, so its age is not known. Give one, and judge its age yourself.';
    return [warn(flagAt('forecast-age-unknown', 'caution', null), message)];
  }
  if (ageHours <= OLD_FORECAST_H) return [];
  const message = `The forecast is ${ageHours.toFixed(1)} h old, over ${OLD_FORECAST_H} h: what it would allow is not known. Get the newest one.`;
  return [warn(flagAt('forecast-old', 'danger', null, { ageHours }), message)];
}

function boatWarnings({ boat, stream }: Passage, hasCurve: boolean): Warning[] {
  const warnings: Warning[] = [];
  if (!hasCurve) {
    const message =
      'Without the measures of the vaka and the ama’s waterplane there is no righting curve: heel is not known and the state rests on the load share alone.';
    warnings.push(warn(flagAt('no-curve', 'notice', null), message));
  }
  if ('kgPerM2' in boat.pressure && boat.gustFactor > 1) {
    const message = `The pressure rule of ${boat.pressure.kgPerM2} kg/m² at ${boat.pressure.atKn} kn may already hold gusts; a gust factor of ${boat.gustFactor} is put on top. That errs to the safe side: say so or set one of them right.`;
    warnings.push(warn(flagAt('rule-may-hold-gusts', 'notice', null, { gustFactor: boat.gustFactor }), message));
  }
  if (stream.kind === 'none') {
    warnings.push(
      warn(
        flagAt('no-stream-given', 'notice', null),
        'No stream was given: the check leaves it out. Judge it yourself.',
      ),
    );
  }
  return warnings;
}

/** Less than this apart, the two winds read the same on screen. */
const SHOWN_APART_KN = 0.1;

function carryWarnings({ boat }: Passage): Warning[] {
  return boat.reefs.flatMap((reef, reefIndex) => {
    const carried = [reef.carryUpToMeanKn, reef.carryUpToGustKn && reef.carryUpToGustKn / boat.gustFactor];
    const carryUpToKn = Math.max(...carried.map((kn) => kn ?? 0));
    const holdsUpToKn = carryUpToKn > 0 ? reefHolds(boat, reef).worstKn : 0;
    if (carryUpToKn - holdsUpToKn < SHOWN_APART_KN) return [];
    const numbers = { reefIndex, carryUpToKn, holdsUpToKn };
    const message = `“${reef.name}” is carried up to a mean of ${carryUpToKn.toFixed(1)} kn, but holds up to ${holdsUpToKn.toFixed(1)} kn at its worst wind angle. The check calls the next reef from there.`;
    return [warn(flagAt('carry-above-holds', 'caution', null, numbers), message)];
  });
}

function hoursWarnings({ limits }: Passage, hours: Hours | null): Warning[] {
  if (limits?.hours === undefined) return [];
  const limitH = limits.hours;
  if (hours === null) {
    const message = `Whether she arrives within your ${limitH} h is not known, since the arrival is not.`;
    return [warn(flagAt('over-hours-limit', 'danger', null, { limitH }), message)];
  }
  if (hours <= limitH) return [];
  const message = `The passage takes ${hours.toFixed(1)} h, over your limit of ${limitH} h.`;
  return [warn(flagAt('over-hours-limit', 'danger', null, { hours, limitH }), message)];
}
