import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';

interface PutAwayProps {
  readonly id: string;
  /** What it is: "boat". */
  readonly what: string;
  readonly name: string;
  /** What goes out of sight, and where it can be brought back. */
  readonly children: ReactNode;
  putAway(form: FormData): Promise<void>;
}

/** Takes something out of sight, asked twice; it can be undone. */
export function PutAway({ id, what, name, children, putAway }: PutAwayProps) {
  return (
    <Disclosure summary={`Put this ${what} away`}>
      <p className="mb-3 max-w-prose">{children}</p>
      <form action={putAway}>
        <input type="hidden" name="id" value={id} />
        <Button type="submit" variant="danger">
          Put {name} away
        </Button>
      </form>
    </Disclosure>
  );
}
