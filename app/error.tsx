'use client';

import { Button } from '@/components/ui/button';
import { DeadEnd } from '@/components/ui/dead-end';

interface ErrorPageProps {
  readonly error: Error & { readonly digest?: string };
  reset(): void;
}

export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <DeadEnd title="Something failed on our side">
      <p>
        What this page would say is not known. What you had saved before is kept. Try again; if it fails again, tell
        whoever runs this server{error.digest ? ` the number ${error.digest}` : ''}.
      </p>
      <div className="mt-6">
        <Button onClick={reset}>Try again</Button>
      </div>
    </DeadEnd>
  );
}
