import { type FieldValues, type Path, type UseFormSetError } from 'react-hook-form';
import { ApiProblem, tell } from './problems';

/**
 * Puts a problem's issues on the fields they name; what names no field of the form comes back as one
 * sentence for the banner (null when every issue found its field).
 */
export function showProblem<T extends FieldValues>(
  error: unknown,
  fields: readonly (keyof T & string)[],
  setError: UseFormSetError<T>,
): { text: string; code: string } | null {
  if (!(error instanceof ApiProblem)) return tell(error);
  const known = new Set<string>(fields);
  let placed = 0;
  for (const issue of error.issues) {
    const field = String(issue.path[0] ?? '');
    if (!known.has(field)) continue;
    setError(
      field as unknown as Path<T>,
      { type: issue.code, message: issue.message },
      { shouldFocus: placed === 0 },
    );
    placed += 1;
  }
  return placed > 0 && placed === error.issues.length ? null : tell(error);
}
