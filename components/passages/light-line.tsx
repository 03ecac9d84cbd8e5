import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { formatInZone } from '@/lib/time/format-in-zone';
import { sunTimesOn } from '@/lib/time/sun-times';

type Start = Pick<PassagePlan['route'][number], 'name' | 'lat' | 'lon'>;

interface LightLineProps {
  readonly start: Start;
  readonly departure: string;
  readonly zone: string;
}

/** The light of the day she leaves, at the place she leaves: dawn and dusk are civil, as the check takes them. */
export function LightLine({ start, departure, zone }: LightLineProps) {
  return (
    <p className="text-muted mt-3 text-sm tabular-nums" data-testid="light">
      {lightText(start, Date.parse(departure), zone)}
    </p>
  );
}

export function lightText(start: Start, departure: number, zone: string): string {
  const date = formatInZone(departure, zone, 'input').slice(0, 10);
  const times = sunTimesOn(start, date, zone);
  const at = (instant: number | null | undefined) =>
    instant === null || instant === undefined ? 'none' : formatInZone(instant, zone, 'time');
  return (
    `Light at ${start.name} on ${formatInZone(departure, zone, 'date')}: civil dawn ${at(times?.civilDawn)}, ` +
    `sunrise ${at(times?.sunrise)}, sunset ${at(times?.sunset)}, civil dusk ${at(times?.civilDusk)} ` +
    `(${formatInZone(departure, zone, 'zone')}).`
  );
}
