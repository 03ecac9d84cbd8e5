'use client';

import Link from 'next/link';
import { useActionState, useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { CellInput } from './cell-input';
import { useOwnZone } from './use-own-zone';
import { useZones } from './use-zones';

export interface NewPassageState {
  readonly typed: { readonly boatId: string; readonly name: string; readonly zone: string };
  /** By JSON pointer; the empty one is of the whole form. */
  readonly problems: Readonly<Record<string, string>>;
}

interface NewPassageFormProps {
  readonly boats: readonly { readonly id: string; readonly name: string }[];
  readonly action: (before: NewPassageState, form: FormData) => Promise<NewPassageState>;
}

/** Which boat, under what name, by which clocks. */
export function NewPassageForm({ boats, action }: NewPassageFormProps) {
  const first: NewPassageState = { typed: { boatId: boats[0]?.id ?? '', name: '', zone: '' }, problems: {} };
  const [state, submit, busy] = useActionState(action, first);
  const [name, setName] = useState('');
  const [typedZone, setZone] = useState<string | null>(null);
  const ownZone = useOwnZone();
  const zones = useZones();
  const id = useId();
  const [boatId, setBoatId] = useState(first.typed.boatId);
  if (boats.length === 0) {
    return (
      <p className="border-spruce border-l-2 pl-3">
        You need a boat that you own or skipper.{' '}
        <Link className="underline underline-offset-4" href="/boats">
          Go to the boats
        </Link>{' '}
        and make one first: its sheet holds what the check computes with.
      </p>
    );
  }
  return (
    <form action={submit} className="max-w-xl space-y-4">
      <div>
        <label htmlFor={id} className="text-muted mb-1 block text-sm">
          Boat
        </label>
        <select
          id={id}
          name="boatId"
          value={boatId}
          onChange={(event) => setBoatId(event.target.value)}
          className="border-line bg-ground min-h-11 w-full border px-2"
        >
          {boats.map((boat) => (
            <option key={boat.id} value={boat.id}>
              {boat.name}
            </option>
          ))}
        </select>
        {state.problems['/boatId'] && <p className="text-beyond mt-1 text-sm">{state.problems['/boatId']}</p>}
      </div>
      <CellInput
        label="Name of the passage"
        name="name"
        value={name}
        onValue={setName}
        problem={state.problems['/name']}
        maxLength={160}
      />
      <CellInput
        label="Time zone"
        name="zone"
        value={typedZone ?? ownZone}
        onValue={setZone}
        problem={state.problems['/zone']}
        hint="Where the passage is sailed: its times are shown by these clocks."
        list={`${id}-zones`}
        maxLength={64}
      />
      <datalist id={`${id}-zones`}>
        {zones.map((zone) => (
          <option key={zone} value={zone} />
        ))}
      </datalist>
      {state.problems[''] && (
        <p role="alert" className="text-beyond">
          {state.problems['']}
        </p>
      )}
      <Button type="submit" disabled={busy}>
        Make the passage
      </Button>
    </form>
  );
}
