import type { ReactNode } from 'react';

type Tone = 'plain' | 'good' | 'caution' | 'danger';

const EDGE: Readonly<Record<Tone, string>> = {
  plain: 'border-line',
  good: 'border-within',
  caution: 'border-thin',
  danger: 'border-beyond',
};

interface NoticeProps {
  readonly tone?: Tone;
  readonly title?: string;
  /** Read out when it appears. */
  readonly live?: boolean;
  readonly children: ReactNode;
}

/** Something to be told, with a heavy edge; the words carry the meaning, the edge only draws the eye. */
export function Notice({ tone = 'plain', title, live, children }: NoticeProps) {
  return (
    <div
      role={live ? (tone === 'danger' ? 'alert' : 'status') : undefined}
      className={`bg-panel border border-l-4 px-4 py-3 ${EDGE[tone]}`}
    >
      {title && <p className="font-bold">{title}</p>}
      <div>{children}</div>
    </div>
  );
}
