import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { Beam } from '@/components/charts/beam';
import { beamTiltDeg } from '@/components/charts/beam-tilt';

afterEach(cleanup);

const G = 9.80665;
const draw = (loadShare: number, more: object = {}) => {
  render(
    <Beam rightingNm={1000 * G} heelingNm={1000 * G * loadShare} loadShare={loadShare} workingMargin={1.5} {...more} />,
  );
  const beam = screen.getByRole('img');
  const width = (arm: string) => Number(beam.querySelector(`[data-arm=${arm}]`)!.getAttribute('width'));
  return { beam, righting: width('righting'), heeling: width('heeling') };
};

describe('Beam', () => {
  it('says its numbers, its state and its margin to those who do not see it', () => {
    expect(draw(0.5).beam.getAttribute('aria-label')).toBe(
      'The beam, within limits: heeling moment 500 kg·m against righting moment 1000 kg·m, load share 0.50, working margin 1.5.',
    );
  });

  it.each([0.2, 0.5, 0.9])('draws both arms to one scale at a load share of %d', (share) => {
    const { righting, heeling } = draw(share);
    expect(heeling / righting).toBeCloseTo(share, 9);
  });

  it('keeps the scale where heeling is the longer arm', () => {
    const { righting, heeling } = draw(1.6);
    expect(heeling / righting).toBeCloseTo(1.6, 9);
    expect(heeling).toBeLessThanOrEqual(100);
  });

  it('puts the notch where the working margin is used up', () => {
    const { beam, righting } = draw(0.5);
    const x = Number(/^M([\d.]+) /.exec(beam.querySelector('[data-notch]')!.getAttribute('d')!)![1]);
    expect(x).toBeCloseTo(righting / 1.5, 9);
  });

  it('tells the states apart by tilt, not by colour alone', () => {
    const tiltOf = (share: number) => draw(share).beam.querySelector('g')!.getAttribute('transform');
    expect(tiltOf(0.66)).toBe('rotate(0)');
    cleanup();
    expect(tiltOf(0.8)).not.toBe('rotate(0)');
    cleanup();
    expect(tiltOf(1.01)).toBe('rotate(24)');
  });

  it('tips where more is known than the load share says', () => {
    const { beam } = draw(0.3, { state: 'thin' });
    expect(beam.getAttribute('data-state')).toBe('thin');
    expect(beam.querySelector('g')!.getAttribute('transform')).toBe('rotate(4)');
    expect(beam.getAttribute('aria-label')).toContain('little margin');
  });
});

describe('beamTiltDeg', () => {
  it('is level up to the margin, rises from there, and falls over one', () => {
    expect([0, 0.4, 1 / 1.5].map((share) => beamTiltDeg(share, 1.5))).toEqual([0, 0, 0]);
    const tilts = [0.67, 0.75, 0.9, 1].map((share) => beamTiltDeg(share, 1.5));
    expect([...tilts].sort((a, b) => a - b)).toEqual(tilts);
    expect(tilts[0]).toBeGreaterThan(0);
    expect(tilts[3]).toBeLessThan(beamTiltDeg(1.0001, 1.5));
  });

  it('has nothing between at a working margin of 1', () => {
    expect([beamTiltDeg(1, 1), beamTiltDeg(1.001, 1)]).toEqual([0, 24]);
  });
});
