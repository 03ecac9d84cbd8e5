import { STATE_WORDS } from '@/components/charts/state-words';
import type { CheckState } from '@/lib/passages/passage';

const INK: Readonly<Record<CheckState, string>> = {
  within: 'text-within',
  thin: 'text-thin',
  beyond: 'text-beyond',
  unknown: 'text-unknown',
};

interface StateMarkProps {
  readonly state: CheckState;
  readonly withWord?: boolean;
  /** Side of the mark, px. */
  readonly size?: number;
}

/**
 * A level beam, a tipping beam, a fallen beam, an open ring: each state has a shape and a word of its own, so that
 * neither colour nor light is needed to tell them apart.
 */
export function StateMark({ state, withWord, size = 24 }: StateMarkProps) {
  return (
    <span className={`inline-flex items-center gap-2 ${INK[state]}`} data-state={state}>
      <svg
        viewBox="0 0 24 24"
        width={size}
        height={size}
        role={withWord ? undefined : 'img'}
        aria-label={withWord ? undefined : STATE_WORDS[state]}
        aria-hidden={withWord ? true : undefined}
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
        className="shrink-0"
      >
        <Shape state={state} />
      </svg>
      {withWord && <span className="font-bold">{STATE_WORDS[state]}</span>}
    </span>
  );
}

function Shape({ state }: { readonly state: CheckState }) {
  if (state === 'unknown') return <circle cx="12" cy="12" r="8" strokeDasharray="3.2 2.4" />;
  if (state === 'beyond') {
    return (
      <>
        <path d="M9 21h6L12 13Z" fill="currentColor" />
        <path d="M5 4l12 17" strokeWidth="3" />
      </>
    );
  }
  const turn = state === 'thin' ? 'rotate(16 12 10)' : undefined;
  return (
    <>
      <path d="M8 20h8L12 11Z" fill="currentColor" />
      <path d="M2 10h20" strokeWidth="3" transform={turn} />
    </>
  );
}
