import type { ReactNode } from 'react';
import { Panel } from '@/components/ui/panel';
import { FactList } from './fact-list';

interface CrewPanelProps {
  readonly members: readonly { readonly name: string; readonly role: string }[];
  readonly children?: ReactNode;
}

/** Who has a role on her. */
export function CrewPanel({ members, children }: CrewPanelProps) {
  return (
    <Panel title="Who sails her">
      <FactList facts={members.map(({ name, role }) => ({ what: name, value: role }))} />
      {children && <div className="mt-5">{children}</div>}
    </Panel>
  );
}
