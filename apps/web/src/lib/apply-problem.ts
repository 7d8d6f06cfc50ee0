import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { isApiProblem } from './api-problem';

/** "/contact/email" to "contact.email"; JSON pointers (RFC 6901) write "~" as "~0" and "/" as "~1". */
export const fieldOfPointer = (pointer: string): string =>
  pointer
    .split('/')
    .slice(1)
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');

export interface ProblemPlaces<Values extends FieldValues> {
  /** The fields that the form shows. */
  fields: readonly Path<Values>[];
  /** Where a fault is shown that names none of them. */
  otherwise: Path<Values> | 'root';
  /** What to say instead of the server's words, for problems that a form knows better. */
  describe?: (error: unknown) => string | undefined;
}

/** What went wrong in one sentence, for those who do not need the fields. */
export const wordsOfProblem = (error: unknown): string =>
  isApiProblem(error) ? (error.detail ?? error.title) : 'That did not work; try again.';

/** Shows what the server refused at the fields that it is about; never nowhere. */
export function applyProblem<Values extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<Values>,
  { fields, otherwise, describe }: ProblemPlaces<Values>,
): void {
  const said = describe?.(error);
  const faults = said === undefined && isApiProblem(error) ? error.errors : [];
  if (faults.length === 0) {
    setError(otherwise, { type: 'server', message: said ?? wordsOfProblem(error) });
    return;
  }
  for (const { pointer, detail } of faults) {
    const name = fieldOfPointer(pointer);
    const field = fields.find((each) => each === name) ?? otherwise;
    setError(field, { type: 'server', message: detail });
  }
}
