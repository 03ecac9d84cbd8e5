import { ButtonLink } from '@/components/ui/button';
import { DeadEnd } from '@/components/ui/dead-end';

export default function NotFound() {
  return (
    <DeadEnd title="Nothing at this place">
      <p>The address is wrong, it was taken away, or it is not shared with you. Nothing of yours is lost.</p>
      <div className="mt-6">
        <ButtonLink href="/passages">Go to your passages</ButtonLink>
      </div>
    </DeadEnd>
  );
}
