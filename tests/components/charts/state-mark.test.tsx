import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { StateMark } from '@/components/charts/state-mark';
import type { CheckState } from '@/lib/passages/passage';

afterEach(cleanup);

const words: Readonly<Record<CheckState, string>> = {
  within: 'within limits',
  thin: 'little margin',
  beyond: 'beyond righting moment',
  unknown: 'not known',
};
const states = Object.keys(words) as CheckState[];

describe('StateMark', () => {
  it.each(states)('%s has its word, seen or read out', (state) => {
    render(<StateMark state={state} />);
    expect(screen.getByRole('img', { name: words[state] })).toBeTruthy();
    cleanup();
    render(<StateMark state={state} withWord />);
    expect(screen.getByText(words[state])).toBeTruthy();
    expect(screen.queryByRole('img')).toBeNull();
  });

  it('has a shape of its own for each state', () => {
    const shapes = states.map((state) => {
      const { container } = render(<StateMark state={state} />);
      const drawn = container.querySelector('svg')!.innerHTML;
      cleanup();
      return drawn;
    });
    expect(new Set(shapes).size).toBe(4);
  });
});
