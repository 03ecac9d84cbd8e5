import { Disclosure } from '@/components/ui/disclosure';
import type { WorkingStep } from './working';

/** Opens the equations behind a figure, each with its numbers and its source. */
export function ShowWorking({ of, steps }: { readonly of: string; readonly steps: readonly WorkingStep[] }) {
  return (
    <Disclosure summary={`Show working of ${of}`}>
      <ol className="space-y-4 text-sm">
        {steps.map(({ what, equation, numbers, result, source }) => (
          <li key={what} className="border-line border-l-2 pl-3">
            <p className="font-bold">{what}</p>
            <p className="italic">{equation}</p>
            <p className="break-words">
              = {numbers} = <strong>{result}</strong>
            </p>
            {source && <p className="text-muted">Source: {source}</p>}
          </li>
        ))}
      </ol>
    </Disclosure>
  );
}
