import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';

interface PutAwayProps {
  readonly boatId: string;
  readonly name: string;
  putAway(form: FormData): Promise<void>;
}

/** Takes a boat out of sight, asked twice; it can be undone. */
export function PutAway({ boatId, name, putAway }: PutAwayProps) {
  return (
    <Disclosure summary="Put this boat away">
      <p className="mb-3 max-w-prose">
        {name} and her passages go out of sight, for her crew too. You can bring her back from the list of boats for 30
        days.
      </p>
      <form action={putAway}>
        <input type="hidden" name="boatId" value={boatId} />
        <Button type="submit" variant="danger">
          Put {name} away
        </Button>
      </form>
    </Disclosure>
  );
}
