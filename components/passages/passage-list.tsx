import Link from 'next/link';
import { StateMark } from '@/components/charts/state-mark';
import { STATE_WORDS } from '@/components/charts/state-words';
import type { CheckState } from '@/lib/passages/passage';
import { formatInZone } from '@/lib/time/format-in-zone';
import { stateAsOfNow } from './as-of-now';

export interface ListedPassage {
  readonly id: string;
  readonly name: string;
  readonly boatName: string;
  readonly zone: string;
  readonly departure: Date;
  readonly state: CheckState | null;
  readonly forecastIssuedAt: Date | null;
  readonly worstLeg: { readonly position: number; readonly from: string; readonly to: string } | null;
}

/** The passages, next departures first, each with its state as it may be said now and its worst leg by name. */
export function PassageList({ passages, now }: { readonly passages: readonly ListedPassage[]; readonly now: Date }) {
  if (passages.length === 0) {
    return (
      <p className="border-spruce border-l-2 pl-3" data-testid="no-passages">
        No passages yet. Make one: choose a boat and a name, then click the track on the map and put in the forecast
        wind.
      </p>
    );
  }
  return (
    <ul className="divide-line border-line divide-y border-y" data-testid="passage-list">
      {passages.map((passage) => (
        <PassageLine key={passage.id} passage={passage} now={now} />
      ))}
    </ul>
  );
}

function PassageLine({ passage, now }: { readonly passage: ListedPassage; readonly now: Date }) {
  const ageH = passage.forecastIssuedAt ? (now.getTime() - passage.forecastIssuedAt.getTime()) / 3_600_000 : 0;
  const state = passage.state === null ? 'unknown' : stateAsOfNow(passage.state, ageH);
  const { worstLeg } = passage;
  const departed = passage.departure.getTime() < now.getTime();
  return (
    <li>
      <Link
        href={`/passages/${passage.id}`}
        className="hover:bg-panel grid gap-x-6 gap-y-1 py-4 sm:grid-cols-[1fr_auto]"
      >
        <span className="text-lg font-bold">{passage.name}</span>
        <span className="sm:row-span-2 sm:self-center">
          <StateMark state={state} withWord />
        </span>
        <span className="text-muted text-sm tabular-nums">
          {passage.boatName} · departs {formatInZone(passage.departure.getTime(), passage.zone, 'date-time')},{' '}
          {passage.zone}
          {departed && ' (has passed)'}
        </span>
        <span className="text-sm sm:col-span-2">
          {worstLeg
            ? `Worst: leg ${worstLeg.position + 1}, ${worstLeg.from} to ${worstLeg.to} — ${STATE_WORDS[state]}`
            : 'Not checked yet: open it and save a plan.'}
          {passage.state !== null && state !== passage.state && ' (the forecast has grown old since the check)'}
        </span>
      </Link>
    </li>
  );
}
