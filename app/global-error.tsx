'use client';

import { DeadEnd } from '@/components/ui/dead-end';
import './globals.css';

interface GlobalErrorProps {
  readonly error: Error & { readonly digest?: string };
}

/** Where even the frame fails: it brings its own page. */
export default function GlobalError({ error }: GlobalErrorProps) {
  return (
    <html lang="en" data-theme="day">
      <body>
        <DeadEnd title="Something failed on our side">
          <p>
            The page cannot be shown. What you had saved before is kept. Load it again; if it fails again, tell whoever
            runs this server{error.digest ? ` the number ${error.digest}` : ''}.
          </p>
        </DeadEnd>
      </body>
    </html>
  );
}
