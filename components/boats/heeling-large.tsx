import { Beam } from '@/components/charts/beam';
import { StateMark } from '@/components/charts/state-mark';
import type { Reef } from '@/lib/rigging/craft';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { BenchLoad } from './heeling-bench-load';
import { figure, kgM } from './show';
import { workingHeeling } from './working-heeling';
import { ShowWorking } from './working-steps';

interface HeelingLargeProps {
  readonly sheet: BoatSheet;
  readonly reef: Reef;
  readonly load: BenchLoad;
}

/** The large beam of one reef, what it says in words, and its working. */
export function HeelingLarge({ sheet, reef, load }: HeelingLargeProps) {
  const { heelingNm, rightingNm, loadShare } = load;
  return (
    <div className="mb-6">
      <div className="grid items-center gap-4 md:grid-cols-[minmax(0,28rem)_1fr]">
        <Beam
          size="large"
          heelingNm={heelingNm}
          rightingNm={rightingNm}
          loadShare={loadShare}
          workingMargin={sheet.workingMargin}
          state={load.state}
        />
        <div aria-live="polite" className="space-y-2">
          <p className="text-lg">
            <StateMark state={load.state} withWord />
          </p>
          <p>
            “{reef.name}” heels her with {kgM(heelingNm)}; she rights with {kgM(rightingNm)}. Load share{' '}
            {figure(loadShare, 2)}; the working margin of {figure(sheet.workingMargin, 2)} is kept up to{' '}
            {figure(1 / sheet.workingMargin, 2)}.
          </p>
          {load.carryExceeded && <p>The wind is over what you carry this sail up to.</p>}
        </div>
      </div>
      <div className="mt-3">
        <ShowWorking
          of={`the heeling moment with “${reef.name}”`}
          steps={[
            ...workingHeeling(sheet, reef, load.apparentKn),
            {
              what: 'Load share, u',
              equation: 'HM0 in the gust ÷ RM0',
              numbers: `${kgM(heelingNm)} ÷ ${kgM(rightingNm)}`,
              result: figure(loadShare, 3),
            },
          ]}
        />
      </div>
    </div>
  );
}
