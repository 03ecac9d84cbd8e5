import type { ReactNode } from 'react';

interface DisclosureProps {
  readonly summary: string;
  readonly children: ReactNode;
}

/** Opens what stands behind a figure. */
export function Disclosure({ summary, children }: DisclosureProps) {
  return (
    <details className="border-line border-t border-b">
      <summary className="text-spruce min-h-11 py-2.5 font-bold underline decoration-dotted underline-offset-4">
        {summary}
      </summary>
      <div className="pb-4">{children}</div>
    </details>
  );
}
