import { HOLDS_UP_TO_CAP_KN } from '@/lib/rigging/holds-up-to';
import { GRAVITY_M_S2 } from '@/lib/units/constants';
import type { NewtonMetres } from '@/lib/units/quantities';

const formats = new Map<number, Intl.NumberFormat>();

/** A number with at most so many decimals, thousands apart, a true minus sign. */
export function figure(value: number, decimals = 0): string {
  let format = formats.get(decimals);
  if (!format) {
    format = new Intl.NumberFormat('en-GB', { maximumFractionDigits: decimals });
    formats.set(decimals, format);
  }
  return format.format(Math.abs(value) < 0.5 * 10 ** -decimals ? 0 : value).replace('-', '−');
}

/** In kg·m, as builders reckon. */
export function kgM(moment: NewtonMetres): string {
  return `${figure(moment / GRAVITY_M_S2)} kg·m`;
}

export function newtonM(moment: NewtonMetres): string {
  return `${figure(moment)} N·m`;
}

/** A wind that must not be passed: cut, never rounded up. */
export function limitKn(kn: number): string {
  if (kn >= HOLDS_UP_TO_CAP_KN) return `over ${HOLDS_UP_TO_CAP_KN} kn`;
  return `${(Math.floor(kn * 10 + 1e-9) / 10).toFixed(1)} kn`;
}

export function percent(share: number): string {
  return `${figure(share * 100)} %`;
}
