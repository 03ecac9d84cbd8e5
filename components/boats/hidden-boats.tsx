import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';

interface HiddenBoatsProps {
  readonly boats: readonly { readonly id: string; readonly name: string; readonly role: string }[];
  bringBack(form: FormData): Promise<void>;
}

/** Boats that were put away so short ago that their owner can bring them back. */
export function HiddenBoats({ boats, bringBack }: HiddenBoatsProps) {
  const own = boats.filter(({ role }) => role === 'owner');
  if (own.length === 0) return null;
  return (
    <div className="mt-8">
      <Disclosure summary={`Put away (${own.length}), kept for 30 days`}>
        <ul>
          {own.map(({ id, name }) => (
            <li key={id} className="border-line flex flex-wrap items-center justify-between gap-3 border-b py-2">
              <span className="font-bold">{name}</span>
              <form action={bringBack}>
                <input type="hidden" name="boatId" value={id} />
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
