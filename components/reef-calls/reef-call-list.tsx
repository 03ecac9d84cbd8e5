import { mergeReefCalls } from '@/lib/reef-calls/merge-reef-calls';
import { placeWords } from '@/lib/passage-check/place-words';
import type { LegResult } from '@/lib/passages/passage';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';

interface ReefCallListProps {
  readonly legs: readonly LegResult[];
  readonly plan: PassagePlan;
  readonly reefNames: readonly string[];
}

/** Which reef, when to call it and by when it is wanted, where, and for what wind. A reef that only stays in is not called again. */
export function ReefCallList({ legs, plan, reefNames }: ReefCallListProps) {
  const calls = mergeReefCalls(legs);
  if (calls.length === 0) return <p>No reef call is known: nothing of the passage could be sailed on paper.</p>;
  return (
    <ol className="divide-line border-line divide-y border-y tabular-nums" data-testid="reef-calls">
      {calls.map((call, i) => {
        const before = calls[i - 1];
        const deeper = !before || reefNames.indexOf(call.reef) > reefNames.indexOf(before.reef);
        const clock = (iso: string) => formatInZone(Date.parse(iso), plan.zone, 'time');
        const zoned = (iso: string) => formatInZone(Date.parse(iso), plan.zone, 'time-zone');
        return (
          <li key={`${call.at}-${call.reef}`} className="grid gap-x-4 gap-y-0.5 py-2 sm:grid-cols-[11rem_1fr]">
            <span className="font-bold">
              {i === 0 ? `Start with ${call.reef}` : deeper ? `Reef: ${call.reef}` : `Shake out to ${call.reef}`}
            </span>
            <span>
              {clock(call.at) === clock(call.by)
                ? `${i === 0 ? 'from' : 'call at'} ${zoned(call.at)}`
                : `call at ${clock(call.at)}, in by ${zoned(call.by)}`}
              , leg {call.legIndex + 1}, {placeOf(call.legIndex, call, plan)}; for mean {Math.round(call.meanKn)} kn,
              gust {Math.round(call.gustKn)} kn
            </span>
          </li>
        );
      })}
    </ol>
  );
}

function placeOf(legIndex: number, place: { lat: number; lon: number }, plan: PassagePlan): string {
  const from = plan.route[legIndex];
  const to = plan.route[legIndex + 1];
  return from && to ? placeWords(place, from, to) : 'place not known';
}
