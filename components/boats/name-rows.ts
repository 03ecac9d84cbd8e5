import type { Problem } from './list-problems';
import type { SheetForm } from './sheet-form';

/** Puts the row's name before a message that does not say of which row it is. */
export function nameRows(problems: readonly Problem[], sheet: SheetForm['sheet']): readonly Problem[] {
  return problems.map(({ path, message }) => {
    const name = rowName(path, sheet);
    return { path, message: name === null || message.includes(name) ? message : `${name} — ${message}` };
  });
}

function rowName(path: string, { masses, reefs, polar }: SheetForm['sheet']): string | null {
  const [, list, row, deeper] = /^sheet\.(masses|reefs|leewayDeg|polar\.speedsKn)\.(\d+)(?:\.(\w+))?/.exec(path) ?? [];
  if (list === undefined) return null;
  const index = Number(row);
  if (list === 'masses') return masses[index]?.label.trim() || `Item ${index + 1}`;
  if (list === 'reefs') return reefs[index]?.name.trim() || `Reef ${index + 1}`;
  if (list === 'leewayDeg') return `Row ${index + 1}`;
  const angle = deeper === undefined ? '' : `, ${polar.windAnglesDeg[Number(deeper)] || '?'}°`;
  return `${polar.windSpeedsKn[index] || '?'} kn${angle}`;
}
