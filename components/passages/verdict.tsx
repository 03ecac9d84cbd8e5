import { Caution } from '@/components/charts/caution';
import { StateMark } from '@/components/charts/state-mark';
import { STATE_WORDS } from '@/components/charts/state-words';
import { dangersBeside, describeLegState, worstLegIndex } from '@/lib/passage-check/describe';
import type { CheckResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { legScene } from './leg-scene';

interface VerdictProps {
  readonly result: CheckResult;
  readonly plan: PassagePlan;
  readonly reefNames: readonly string[];
}

/** The passage's state, its worst leg by name, and why, in words with numbers. */
export function Verdict({ result, plan, reefNames }: VerdictProps) {
  const worst = worstLegIndex(result.legs);
  const leg = worst === null ? undefined : result.legs[worst];
  return (
    <VerdictFrame state={result.state} headline={capital(STATE_WORDS[result.state])}>
      {leg && worst !== null && (
        <>
          <p className="text-lg" data-testid="worst-leg">
            Worst: leg {worst + 1}, {leg.from} to {leg.to} — {STATE_WORDS[leg.state]}
          </p>
          <p className="mt-1">{describeLegState(leg, legScene(plan, worst, reefNames))}</p>
        </>
      )}
      <Besides dangers={dangersBeside(result.legs, (index) => legScene(plan, index, reefNames))} />
    </VerdictFrame>
  );
}

const SHOWN = 3;

/** What the state does not tell, so that no calm headline stands alone over land on the track. */
function Besides({ dangers }: { readonly dangers: readonly string[] }) {
  if (dangers.length === 0) return null;
  return (
    <div className="mt-2" data-testid="dangers-beside">
      <p className="font-bold">Besides:</p>
      <ul className="list-inside list-disc">
        {dangers.slice(0, SHOWN).map((danger) => (
          <li key={danger}>{danger}</li>
        ))}
        {dangers.length > SHOWN && <li>and {dangers.length - SHOWN} more, under the legs.</li>}
      </ul>
    </div>
  );
}

interface FrameProps {
  readonly state: CheckResult['state'];
  readonly headline: string;
  readonly children?: React.ReactNode;
}

/** The place of the verdict on the page; while there is none it holds "not known" and why. */
export function VerdictFrame({ state, headline, children }: FrameProps) {
  return (
    <section
      aria-label="Verdict"
      aria-live="polite"
      className="border-line bg-panel border p-4"
      data-testid="verdict"
      data-state={state}
    >
      <div className="flex items-start gap-4">
        <StateMark state={state} size={56} />
        <div className="min-w-0">
          <h2 className="text-2xl font-bold">{headline}</h2>
          {children}
        </div>
      </div>
      <div className="mt-3">
        <Caution />
      </div>
    </section>
  );
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
