import { cleanup, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { PolarCsv } from '@/components/boats/polar-csv';

afterEach(cleanup);

const header = 'true_wind_speed_kn,true_wind_angle_deg,boat_speed_kn';
const good = `${header}\n6,60,2.5\n6,120,3\n12,60,4\n12,120,5.5\n`;

function show() {
  const onPolar = vi.fn();
  render(<PolarCsv onPolar={onPolar} />);
  const field = screen.getByLabelText<HTMLTextAreaElement>('Polar as CSV');
  const paste = (text: string) => {
    fireEvent.change(field, { target: { value: text } });
    fireEvent.click(screen.getByRole('button', { name: 'Take over the pasted polar' }));
  };
  const upload = (file: File) => {
    fireEvent.change(screen.getByLabelText('Take it from a file'), { target: { files: [file] } });
  };
  return { onPolar, field, paste, upload };
}

const findings = () => screen.queryAllByRole('listitem').map((item) => item.textContent);

describe('PolarCsv', () => {
  it('takes a pasted polar over and says how large it is', () => {
    const { onPolar, paste } = show();
    paste(good);
    expect(onPolar).toHaveBeenCalledWith({
      windSpeedsKn: [6, 12],
      windAnglesDeg: [60, 120],
      speedsKn: [
        [2.5, 3],
        [4, 5.5],
      ],
    });
    expect(screen.getByRole('status').textContent).toContain('2 wind speeds by 2 wind angles');
  });

  it('names every bad line, takes nothing over and keeps the text', () => {
    const { onPolar, paste, field } = show();
    const bad = good.replace('6,120,3', '6,120,three').replace('12,60,4', '12,60,400');
    paste(bad);
    expect(onPolar).not.toHaveBeenCalled();
    expect(field.value).toBe(bad);
    expect(findings()).toHaveLength(2);
    expect(findings()[0]).toMatch(/^Line 3, boat_speed_kn: “three” is not a number/);
    expect(findings()[1]).toMatch(/^Line 4, boat_speed_kn: 400 is outside/);
  });

  it('names a hole by wind and angle', () => {
    const { onPolar, paste } = show();
    paste(good.replace('12,60,4\n', ''));
    expect(onPolar).not.toHaveBeenCalled();
    expect(findings().join()).toContain('No boat speed for 12 kn at 60°');
  });

  it('forgets its findings once a good polar comes', () => {
    const { paste } = show();
    paste('nonsense');
    expect(findings().length).toBeGreaterThan(0);
    paste(good);
    expect(findings()).toHaveLength(0);
  });

  it('reads a file, and shows its text', async () => {
    const { onPolar, upload, field } = show();
    upload(new File([good], 'polar.csv', { type: 'text/csv' }));
    await waitFor(() => expect(onPolar).toHaveBeenCalledTimes(1));
    expect(field.value).toBe(good);
  });

  it('refuses what is no text, and what is far too large, in words', async () => {
    const { onPolar, upload, field } = show();
    upload(new File([new Uint8Array([0x89, 0x50, 0, 0, 1])], 'boat.png', { type: 'image/png' }));
    await waitFor(() => expect(findings().join()).toContain('not a text file'));
    expect(field.value).toBe('');
    upload(new File([new Uint8Array(1_000_001)], 'large.csv'));
    await waitFor(() => expect(findings().join()).toContain('over 1 MB'));
    expect(onPolar).not.toHaveBeenCalled();
  });
});
