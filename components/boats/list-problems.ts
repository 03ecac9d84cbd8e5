export interface Problem {
  /** As react-hook-form names fields: "sheet.masses.0.kg". */
  readonly path: string;
  readonly message: string;
}

/** Every message in a tree of errors, in the order of the tree. */
export function listProblems(errors: unknown, path = ''): readonly Problem[] {
  if (typeof errors !== 'object' || errors === null) return [];
  const { message, type } = errors as { message?: unknown; type?: unknown };
  if (typeof message === 'string' && type !== undefined) return [{ path, message }];
  return Object.entries(errors).flatMap(([key, value]) => {
    if (key === 'ref') return [];
    const deeper = key === 'root' ? path : path === '' ? key : `${path}.${key}`;
    return listProblems(value, deeper);
  });
}

/** The id of the control, or of the section, that a path is about. */
export function fieldId(path: string): string {
  return `f-${path.replaceAll('.', '-')}`;
}

/** A field of the form from a JSON pointer of the server's answer. */
export function pathOfPointer(pointer: string): string {
  return pointer
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');
}
