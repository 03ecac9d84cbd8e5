import type { ReactNode } from 'react';
import { StateMark } from '@/components/charts/state-mark';

/** Says that something is not known, and what would make it known. */
export function NotKnown({ children }: { readonly children?: ReactNode }) {
  return (
    <span>
      <StateMark state="unknown" withWord size={18} />
      {children && <span className="text-muted block text-sm">{children}</span>}
    </span>
  );
}
