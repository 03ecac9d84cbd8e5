import type { CheckResult } from '@/lib/passages/passage';
import { formatInZone } from '@/lib/time/format-in-zone';
import { hoursText, loadShareText, nmi } from './show';

/** The whole passage in six figures; what is not known says so. */
export function Totals({
  result,
  departure,
  zone,
}: {
  readonly result: CheckResult;
  readonly departure: string;
  readonly zone: string;
}) {
  const { totals } = result;
  const facts: readonly (readonly [string, string])[] = [
    ['Departure', formatInZone(Date.parse(departure), zone, 'date-time')],
    ['Arrival', totals.arrival === null ? 'not known' : formatInZone(Date.parse(totals.arrival), zone, 'date-time')],
    ['Under way', totals.hours === null ? 'not known' : hoursText(totals.hours)],
    [
      'Distance',
      `${nmi(totals.distanceNmi)}, ${nmi(totals.sailedNmi)} sailed${totals.arrival === null ? ' as far as known' : ''}`,
    ],
    ['Shunts', `${totals.shunts}${totals.arrival === null ? ' as far as known' : ''}`],
    ['Largest load share', totals.largestLoadShare === null ? 'not known' : loadShareText(totals.largestLoadShare)],
  ];
  return (
    <dl className="grid grid-cols-2 gap-x-6 gap-y-2 tabular-nums sm:grid-cols-3 lg:grid-cols-6" data-testid="totals">
      {facts.map(([name, value]) => (
        <div key={name} className="border-ink border-t-2 pt-1">
          <dt className="text-muted text-sm">{name}</dt>
          <dd className="font-bold">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
