import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';

interface PutAwayListProps {
  readonly items: readonly { readonly id: string; readonly name: string }[];
  bringBack(form: FormData): Promise<void>;
}

/** What was put away so short ago that it can be brought back. */
export function PutAwayList({ items, bringBack }: PutAwayListProps) {
  if (items.length === 0) return null;
  return (
    <div className="mt-8">
      <Disclosure summary={`Put away (${items.length}), kept for 30 days`}>
        <ul>
          {items.map(({ id, name }) => (
            <li key={id} className="border-line flex flex-wrap items-center justify-between gap-3 border-b py-2">
              <span className="font-bold">{name}</span>
              <form action={bringBack}>
                <input type="hidden" name="id" value={id} />
                <Button type="submit" variant="plain">
                  Bring back
                </Button>
              </form>
            </li>
          ))}
        </ul>
      </Disclosure>
    </div>
  );
}
