import { GRAVITY_M_S2, METRES_PER_NMI } from '@/lib/units/constants';

/** Numbers as the screens say them: always with their unit, always with as many digits as they deserve. */
const whole = new Intl.NumberFormat('en-GB', { maximumFractionDigits: 0 });

export function degreesOf(deg: number): string {
  return `${String(Math.round(deg) % 360).padStart(3, '0')}°`;
}

export function nmi(value: number): string {
  return `${value.toFixed(value < 10 ? 2 : 1)} nmi`;
}

export function nmiOfMetres(metres: number): string {
  return nmi(metres / METRES_PER_NMI);
}

export function knots(value: number): string {
  return `${Math.round(value)} kn`;
}

export function newtonMetres(value: number): string {
  return `${whole.format(value)} N·m`;
}

/** N·m as the kg·m of the builder's hand method. */
export function kilogramMetres(valueNm: number): string {
  return `${whole.format(valueNm / GRAVITY_M_S2)} kg·m`;
}

export function loadShareText(value: number): string {
  return value.toFixed(2);
}

export function hoursText(hours: number): string {
  const minutes = Math.round(hours * 60);
  return minutes < 60 ? `${minutes} min` : `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, '0')} min`;
}

export function countText(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}
