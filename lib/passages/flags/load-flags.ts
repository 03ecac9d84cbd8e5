import { flagAt, minutesWhere, worstSample, type LegContext } from '@/lib/passages/flags/leg-context';
import type { Flag } from '@/lib/passages/passage';
import type { Sample } from '@/lib/passages/sample';

/** Where heeling moment comes near or over righting moment, at the worst instant of each. docs/model.md §3. */
export function loadFlags({ prepared, followed }: LegContext): Flag[] {
  const flags: Flag[] = [];
  const add = (code: Flag['code'], severity: Flag['severity'], passes: (sample: Sample) => boolean) => {
    const worst = worstSample(followed.samples, passes, (sample) => sample.decision.load.loadShare);
    if (!worst) return;
    const numbers = {
      ...numbersOf(worst),
      workingMargin: prepared.boat.workingMargin,
      minutes: minutesWhere(followed, passes),
    };
    flags.push(flagAt(code, severity, worst, numbers));
  };
  add('beyond-righting-moment', 'danger', ({ decision }) => decision.load.state === 'beyond');
  add('little-margin', 'caution', ({ decision }) => decision.load.state === 'thin');
  add('carry-up-to-exceeded', 'caution', ({ decision }) => decision.load.carryExceeded);
  if (!prepared.curve) flags.push(flagAt('no-curve', 'notice', null));
  return flags;
}

function numbersOf({ wind, decision }: Sample): Record<string, number> {
  const { load } = decision;
  return {
    reefIndex: decision.reefIndex,
    meanKn: wind.meanKn,
    gustKn: wind.gustKn,
    loadShare: load.loadShare,
    ...(load.atRestShare === null ? {} : { loadShareAtRest: load.atRestShare }),
    heelingMomentNewtonM: load.heelingNm,
    rightingMomentNewtonM: load.rightingNm,
  };
}
