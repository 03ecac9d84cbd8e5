import type { ReactNode } from 'react';

export interface Fact {
  readonly what: string;
  readonly value: ReactNode;
}

/** Names and values, ruled like a notebook. */
export function FactList({ facts }: { readonly facts: readonly Fact[] }) {
  return (
    <dl>
      {facts.map(({ what, value }) => (
        <div key={what} className="border-line flex flex-wrap justify-between gap-x-4 border-b py-2">
          <dt>{what}</dt>
          <dd className="text-right font-bold">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
