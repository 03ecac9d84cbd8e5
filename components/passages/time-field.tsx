'use client';

import { formatInZone } from '@/lib/time/format-in-zone';
import { CellInput } from './cell-input';
import type { TimeDraft } from './plan-draft';
import { isZone } from './plan-from-draft';
import { readTime } from './read-time';

interface TimeFieldProps {
  readonly label: string;
  readonly value: TimeDraft;
  readonly zone: string;
  onValue: (value: TimeDraft) => void;
  readonly problem?: string | undefined;
  readonly hideLabel?: boolean;
}

/** A date and time in the passage's zone. Where the clocks go back over it, both instants are offered. */
export function TimeField({ label, value, zone, onValue, problem, hideLabel }: TimeFieldProps) {
  const known = isZone(zone);
  const reading = readTime(value, known ? zone : 'UTC');
  const twice = reading.kind === 'which' || (reading.kind === 'instant' && reading.twice);
  const both = twice ? readTime({ ...value, which: '' }, zone) : null;
  return (
    <div className="min-w-0">
      <CellInput
        label={`${label}, date and time`}
        value={value.text}
        onValue={(text) => onValue({ text, which: value.which })}
        problem={problem}
        hideLabel={hideLabel ?? false}
        placeholder="2026-06-01 09:00"
        maxLength={40}
      />
      {both?.kind === 'which' && (
        <fieldset className="mt-1 text-sm">
          <legend className="sr-only">{label}: which of the two</legend>
          {(
            [
              ['earlier', both.earlierMs, 'first'],
              ['later', both.laterMs, 'second'],
            ] as const
          ).map(([which, ms, word]) => (
            <label key={which} className="mr-3 inline-flex min-h-9 items-center gap-1">
              <input
                type="radio"
                className="accent-spruce"
                checked={value.which === which}
                onChange={() => onValue({ text: value.text, which })}
              />
              {word}, {formatInZone(ms, zone, 'zone')}
            </label>
          ))}
        </fieldset>
      )}
    </div>
  );
}
