import Link from 'next/link';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import type { EpochMs } from '@/lib/units/quantities';
import type { AsOfNow } from './as-of-now';
import type { ReadCheck } from './passage-reading';
import { hoursText } from './show';

interface CheckOriginProps {
  readonly check: ReadCheck;
  readonly boat: { readonly id: string; readonly name: string; readonly sheetNumber: number };
  readonly passage: PassagePlan;
  readonly now: AsOfNow;
  readonly nowMs: EpochMs;
}

/** Where a stored check comes from, and what has changed since it was made. */
export function CheckOrigin({ check, boat, passage, now, nowMs }: CheckOriginProps) {
  const { zone } = passage;
  const notes = [
    now.hasAged
      ? `The forecast is now ${hoursText(now.forecastAgeH)} old. What it allowed when checked is not known any more: get the newest one and save again.`
      : null,
    boat.sheetNumber > check.sheetNumber
      ? `The boat sheet has changed since: it is now number ${boat.sheetNumber}. Open the planner and save to check with it.`
      : null,
    Date.parse(passage.departure) < nowMs ? 'The departure of this plan has passed.' : null,
  ].filter((note) => note !== null);
  return (
    <div className="mt-3 text-sm" data-testid="check-origin">
      <p className="text-muted">
        Checked {formatInZone(new Date(check.checkedAt).getTime(), zone, 'date-time')} by {check.checkedBy} with{' '}
        <Link href={`/boats/${boat.id}`} className="underline underline-offset-4">
          {boat.name}, boat sheet {check.sheetNumber}
        </Link>
        , engine {check.engineVersion}. Wind: {passage.wind.source}, issued{' '}
        {formatInZone(Date.parse(passage.wind.issuedAt), zone, 'date-time')}.
      </p>
      {notes.length > 0 && (
        <ul className="border-thin mt-2 space-y-1 border-l-4 pl-3" data-testid="check-notes">
          {notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
      )}
    </div>
  );
}
