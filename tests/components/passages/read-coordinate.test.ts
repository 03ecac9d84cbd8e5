import { describe, expect, it } from 'vitest';
import { readCoordinate, type Axis } from '@/components/passages/read-coordinate';

const value = (text: string, axis: Axis) => {
  const reading = readCoordinate(text, axis);
  return 'value' in reading ? reading.value : reading.problem;
};

describe('readCoordinate', () => {
  it.each([
    ['48.535', 'lat', 48.535],
    ['-123.0312', 'lon', -123.0312],
    ['−123.0312', 'lon', -123.0312],
    ['48,535', 'lat', 48.535],
    ["48°32.1'N", 'lat', 48 + 32.1 / 60],
    ['48° 32.1′ N', 'lat', 48 + 32.1 / 60],
    ['48 32.1 n', 'lat', 48 + 32.1 / 60],
    ['N48 32.1', 'lat', 48 + 32.1 / 60],
    ['123°01.9′W', 'lon', -(123 + 1.9 / 60)],
    ['48°32\'06"S', 'lat', -(48 + 32 / 60 + 6 / 3600)],
    ['-0 30', 'lat', -0.5],
    ['12.5 W', 'lon', -12.5],
  ] as const)('reads %s', (text, axis, expected) => {
    expect(value(text, axis)).toBeCloseTo(expected, 9);
  });

  it.each([
    ['', 'lat', /give degrees/],
    ['north', 'lat', /cannot be read/],
    ['48°61′N', 'lat', /under 60/],
    ["48.5°32.1'N", 'lat', /cannot be read/],
    ["48°32.1'W", 'lat', /takes N or S/],
    ['12 E', 'lat', /takes N or S/],
    ["-123°01.9'W", 'lon', /not both/],
    ['48.5.3', 'lat', /cannot be read/],
    ['48 32 1 4', 'lat', /cannot be read/],
  ] as const)('refuses %s with a message', (text, axis, message) => {
    expect(value(text, axis)).toMatch(message);
  });
});
