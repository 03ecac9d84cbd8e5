import { StateMark } from '@/components/charts/state-mark';
import type { LegFacts } from './leg-facts';
import { LoadShare } from './legs-table';
import { ReefLines } from './reef-lines';

interface LegCardsProps {
  readonly facts: readonly LegFacts[];
  readonly workingMargin: number;
  readonly selectedLeg: number | null;
  onSelectLeg?: ((index: number) => void) | undefined;
}

/** The legs on a phone: a card each, the same facts as the table. */
export function LegCards({ facts, workingMargin, selectedLeg, onSelectLeg }: LegCardsProps) {
  return (
    <ol className="space-y-3 lg:hidden" data-testid="leg-cards">
      {facts.map((row) => (
        <li
          key={row.index}
          className={`border p-3 text-sm tabular-nums ${selectedLeg === row.index ? 'border-spruce bg-spruce/10' : 'border-line bg-panel'}`}
        >
          <div className="flex flex-wrap items-baseline justify-between gap-x-3 gap-y-1">
            <h4 className="text-base font-bold">
              <button
                type="button"
                className="text-left"
                aria-pressed={selectedLeg === row.index}
                onClick={() => onSelectLeg?.(row.index)}
              >
                {row.index + 1} {row.name}
              </button>
            </h4>
            <StateMark state={row.leg.state} withWord />
          </div>
          <dl className="[&_dt]:text-muted mt-2 grid grid-cols-[auto_1fr] gap-x-3 gap-y-1">
            <dt>Time</dt>
            <dd>{[row.times, row.duration].filter(Boolean).join(', ')}</dd>
            <dt>Course</dt>
            <dd>
              {row.course}, {row.distance}
            </dd>
            <dt>Wind</dt>
            <dd>
              {row.wind}; {row.way}
            </dd>
            <dt>Leading end</dt>
            <dd>
              {row.end}; {row.shunts}
            </dd>
            <dt>Reef called</dt>
            <dd>
              <ReefLines reefs={row.reefs} />
            </dd>
            <dt>Load share</dt>
            <dd>
              <LoadShare row={row} workingMargin={workingMargin} />
            </dd>
            <dt>Heeling</dt>
            <dd>{row.heeling}</dd>
            <dt>Righting</dt>
            <dd>{row.righting}</dd>
          </dl>
        </li>
      ))}
    </ol>
  );
}
