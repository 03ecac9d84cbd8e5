import type { Position } from '@/lib/geo/position';
import { rhumbInverse } from '@/lib/geo/rhumb';
import { METRES_PER_NMI } from '@/lib/units/constants';

interface NamedPlace extends Position {
  readonly name: string;
}

/** This near a waypoint one says "off" it, nmi. */
const OFF_WITHIN_NMI = 0.3;

/** A place on a leg as one says it aboard: "off the point", or "1.2 nmi before the point". */
export function placeWords(place: Position, from: NamedPlace, to: NamedPlace): string {
  const toGoNmi = rhumbInverse(place, to).distanceM / METRES_PER_NMI;
  const goneNmi = rhumbInverse(from, place).distanceM / METRES_PER_NMI;
  if (Math.min(toGoNmi, goneNmi) <= OFF_WITHIN_NMI) {
    const { name } = toGoNmi <= goneNmi ? to : from;
    return /^off\s/i.test(name) ? name : `off ${name}`;
  }
  return `${toGoNmi.toFixed(1)} nmi before ${to.name}`;
}
