'use client';

import { Button } from '@/components/ui/button';
import { fieldId } from './list-problems';

interface RowButtonsProps {
  readonly path: string;
  readonly index: number;
  readonly count: number;
  /** What the row is called, for those who only hear it. */
  readonly name: string;
  move(index: number, by: 1 | -1, name: string): void;
  remove(index: number, name: string): void;
}

/** Up, down and out, for one row. */
export function RowButtons({ path, index, count, name, move, remove }: RowButtonsProps) {
  const id = (what: string) => fieldId(`${path}.${index}.${what}`);
  const square = 'min-w-11 px-2';
  return (
    <div className="flex gap-1">
      <Button
        id={id('up')}
        variant="plain"
        className={square}
        disabled={index === 0}
        aria-label={`Move ${name} up`}
        onClick={() => move(index, -1, name)}
      >
        ↑
      </Button>
      <Button
        id={id('down')}
        variant="plain"
        className={square}
        disabled={index === count - 1}
        aria-label={`Move ${name} down`}
        onClick={() => move(index, 1, name)}
      >
        ↓
      </Button>
      <Button
        variant="plain"
        className={square}
        disabled={count === 1}
        aria-label={`Take ${name} out`}
        onClick={() => remove(index, name)}
      >
        <svg viewBox="0 0 16 16" aria-hidden="true" className="size-3.5" stroke="currentColor" strokeWidth="2.5">
          <path d="M2 2l12 12M14 2L2 14" />
        </svg>
      </Button>
    </div>
  );
}
