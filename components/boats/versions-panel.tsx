import Link from 'next/link';
import { Panel } from '@/components/ui/panel';
import { formatInZone } from '@/lib/time/format-in-zone';

export interface VersionLine {
  readonly number: number;
  readonly savedAt: Date;
  readonly savedBy: string;
}

interface VersionsPanelProps {
  readonly boatId: string;
  readonly versions: readonly VersionLine[];
  readonly shownNumber: number;
}

/** Every version of the boat sheet; none is ever changed. */
export function VersionsPanel({ boatId, versions, shownNumber }: VersionsPanelProps) {
  return (
    <Panel title="Versions">
      <ul>
        {versions.map(({ number, savedAt, savedBy }, index) => (
          <li key={number} className="border-line flex flex-wrap items-center justify-between gap-x-4 border-b">
            {number === shownNumber ? (
              <span className="inline-flex min-h-11 items-center font-bold">Boat sheet {number}, shown here</span>
            ) : (
              <Link
                href={index === 0 ? `/boats/${boatId}` : `/boats/${boatId}/sheets/${number}`}
                className="text-spruce inline-flex min-h-11 items-center font-bold underline underline-offset-4"
              >
                Boat sheet {number}
              </Link>
            )}
            <span className="text-muted text-sm">
              {formatInZone(savedAt.getTime(), 'UTC', 'date-time')}, {savedBy}
            </span>
          </li>
        ))}
      </ul>
    </Panel>
  );
}
