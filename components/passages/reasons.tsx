import { describeLeg, type Description } from '@/lib/passage-check/describe';
import type { CheckResult, Flag, Severity } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { legScene } from './leg-scene';

interface ReasonsProps {
  readonly result: CheckResult;
  readonly plan: PassagePlan;
  readonly reefNames: readonly string[];
}

const WORD: Readonly<Record<Severity, string>> = { danger: 'Danger', caution: 'Caution', notice: 'Note' };
const EDGE: Readonly<Record<Severity, string>> = {
  danger: 'border-beyond',
  caution: 'border-thin',
  notice: 'border-line',
};

/** What was found and why, in words with numbers, and what may be done about it: warnings of the whole, then leg by leg. */
export function Reasons({ result, plan, reefNames }: ReasonsProps) {
  // The age of the forecast is found on every leg and said once, for the whole.
  const whole = new Set(result.warnings.map((warning) => warning.code));
  const legs = result.legs.map((leg, index) => ({
    name: `Leg ${index + 1}, ${leg.from} to ${leg.to}`,
    found: describeLeg(leg, legScene(plan, index, reefNames)).filter(
      ({ flag }) => !(flag.at === null && whole.has(flag.code)),
    ),
  }));
  const found = legs.filter((leg) => leg.found.length > 0);
  return (
    <div className="space-y-4" data-testid="reasons">
      {result.warnings.length > 0 && (
        <section>
          <h4 className="mb-1 font-bold">The whole passage</h4>
          <ul className="space-y-2">
            {result.warnings.map((warning) => (
              <Reason
                key={`${warning.code}-${warning.message}`}
                severity={warning.severity}
                sentence={warning.message}
              />
            ))}
          </ul>
        </section>
      )}
      {found.map((leg) => (
        <section key={leg.name}>
          <h4 className="mb-1 font-bold">{leg.name}</h4>
          <ul className="space-y-2">
            {leg.found.map(({ flag, sentence, remedy }: Description & { flag: Flag }) => (
              <Reason
                key={`${flag.code}-${flag.at ?? ''}`}
                severity={flag.severity}
                sentence={sentence}
                remedy={remedy}
              />
            ))}
          </ul>
        </section>
      ))}
      {result.warnings.length === 0 && found.length === 0 && (
        <p>Nothing was flagged. That is what this model can see, not all there is.</p>
      )}
    </div>
  );
}

interface ReasonProps {
  readonly severity: Severity;
  readonly sentence: string;
  readonly remedy?: string;
}

function Reason({ severity, sentence, remedy }: ReasonProps) {
  return (
    <li className={`border-l-4 pl-3 ${EDGE[severity]}`}>
      <span className="font-bold">{WORD[severity]}.</span> {sentence}
      {remedy && <span className="text-muted block">{remedy}</span>}
    </li>
  );
}
