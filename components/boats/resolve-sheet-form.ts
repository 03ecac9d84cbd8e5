import { zodResolver } from '@hookform/resolvers/zod';
import type { FieldErrors, Resolver } from 'react-hook-form';
import type { z } from 'zod';
import { leewaySchema, pressureSchema } from '@/lib/schemas/boat';
import { newBoatSchema } from '@/lib/schemas/boat-requests';
import { formToSheet } from './form-to-sheet';
import type { SheetForm } from './sheet-form';

const bySchema = zodResolver(newBoatSchema);

/** Holds the typed form against the one schema; each message lands at the field it is about. */
export const resolveSheetForm: Resolver<SheetForm> = async (form, context, options) => {
  const input = { name: form.name, sheet: formToSheet(form.sheet) };
  const { errors } = (await bySchema(input, context, options as never)) as { errors: FieldErrors<SheetForm> };
  if (Object.keys(errors).length === 0) return { values: form, errors: {} };
  const sheet = errors.sheet as Record<string, unknown> | undefined;
  // Of two ways to give a thing, only the chosen one is spoken of.
  if (sheet?.pressure) {
    const way = pressureSchema.options[form.sheet.pressureKind === 'coefficient' ? 0 : 1];
    sheet.pressure = leaves(way.safeParse(input.sheet.pressure).error);
  }
  if (sheet?.leewayDeg && form.sheet.leewayKind === 'one') {
    const issue = leewaySchema.options[0].safeParse(input.sheet.leewayDeg).error?.issues[0];
    delete sheet.leewayDeg;
    if (issue) sheet.leewayOne = { type: issue.code, message: issue.message };
  } else if (sheet?.leewayDeg && !Array.isArray(sheet.leewayDeg)) {
    const error = leewaySchema.options[1].safeParse(input.sheet.leewayDeg).error;
    if (error) sheet.leewayDeg = rows(error);
  }
  return { values: {}, errors };
};

function leaves(error: z.ZodError | undefined): Record<string, { type: string; message: string }> {
  return Object.fromEntries(
    (error?.issues ?? []).map((issue) => [String(issue.path[0]), { type: issue.code, message: issue.message }]),
  );
}

function rows(error: z.ZodError): Record<string, { type: string; message: string }>[] {
  const found: Record<string, { type: string; message: string }>[] = [];
  for (const { code, message, path } of error.issues) {
    const [row, key] = path as [number, string];
    found[row] = { ...found[row], [key]: { type: code, message } };
  }
  return found;
}
