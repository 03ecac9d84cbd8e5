import Link from 'next/link';
import type { BoatRole } from '@/lib/access/permissions';
import { formatInZone } from '@/lib/time/format-in-zone';

export interface ListedBoat {
  readonly id: string;
  readonly name: string;
  readonly role: BoatRole;
  readonly sheetNumber: number;
  readonly sheetSavedAt: Date;
}

/** The boats of a person, by name. */
export function BoatList({ boats }: { readonly boats: readonly ListedBoat[] }) {
  if (boats.length === 0) {
    return (
      <p className="border-spruce border-l-2 pl-3" data-testid="no-boats">
        No boats yet. Make one: weigh her in parts, measure where each part stands, and put in what you carry each reef
        up to. An owner can also share hers with you.
      </p>
    );
  }
  return (
    <ul className="border-line divide-line divide-y border-y" data-testid="boat-list">
      {boats.map(({ id, name, role, sheetNumber, sheetSavedAt }) => (
        <li key={id}>
          <Link href={`/boats/${id}`} className="hover:bg-panel grid gap-x-6 gap-y-1 py-4 sm:grid-cols-[1fr_auto]">
            <span className="text-lg font-bold break-words">{name}</span>
            <span className="sm:text-right">you are {role}</span>
            <span className="text-muted text-sm sm:col-span-2">
              Boat sheet {sheetNumber}, saved {formatInZone(sheetSavedAt.getTime(), 'UTC', 'date-time')}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
