'use client';

import { useState } from 'react';
import { useFieldArray, useFormContext } from 'react-hook-form';
import { fieldId } from './list-problems';
import type { SheetForm } from './sheet-form';

type RowsPath = 'sheet.masses' | 'sheet.reefs' | 'sheet.leewayDeg';

/** Rows that can be added, moved and taken out by keyboard; the focus goes along and what was done is said. */
export function useRows<Path extends RowsPath>(path: Path) {
  const { control, getValues } = useFormContext<SheetForm>();
  const { fields, append, move, remove, insert } = useFieldArray({ control, name: path });
  const [said, say] = useState('');
  const [removed, setRemoved] = useState<{ index: number; row: unknown; name: string } | null>(null);

  const focusSoon = (id: string) => setTimeout(() => document.getElementById(id)?.focus(), 0);
  return {
    fields,
    append,
    said,
    removed,
    move(index: number, by: 1 | -1, name: string) {
      const to = index + by;
      if (to < 0 || to >= fields.length) return;
      move(index, to);
      say(`${name} is now ${to + 1} of ${fields.length}.`);
      const way = to === 0 ? 'down' : to === fields.length - 1 ? 'up' : by < 0 ? 'up' : 'down';
      focusSoon(fieldId(`${path}.${to}.${way}`));
    },
    remove(index: number, name: string) {
      setRemoved({ index, row: getValues(`${path}.${index}` as never), name });
      remove(index);
      say(`${name} taken out.`);
      focusSoon(fieldId(`${path}.back`));
    },
    putBack() {
      if (!removed) return;
      insert(removed.index, removed.row as never, { shouldFocus: true });
      say(`${removed.name} is back.`);
      setRemoved(null);
    },
  };
}
