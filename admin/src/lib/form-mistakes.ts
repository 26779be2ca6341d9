import type { FieldErrors, FieldValues, Path, UseFormSetError } from 'react-hook-form';
import type { FormMistake } from '../components/ui/error-summary.js';
import { isProblem } from './problem-error.js';

/** The id of the box that holds a form's value: `label.where` becomes `label-where`. */
export const fieldId = (name: string): string => name.replaceAll('.', '-');

/** Every message of a form's errors with the box it belongs to, in the order of the form. */
export function mistakesOf<T extends FieldValues>(errors: FieldErrors<T>, path = ''): FormMistake[] {
  return Object.entries(errors).flatMap(([name, error]) => {
    if (!error || typeof error !== 'object') return [];
    if ('message' in error && typeof error.message === 'string' && error.message !== '') {
      const whole = name === 'root' || path.startsWith('root');
      return [{ message: error.message, ...(whole ? {} : { fieldId: fieldId(boxOf(path + name)) }) }];
    }
    if ('ref' in error || 'type' in error) return [];
    return mistakesOf(error as FieldErrors<FieldValues>, `${path}${name}.`);
  });
}

/** A list that is typed in one box (materials.3) is mended in that box. */
function boxOf(path: string): string {
  return path.replace(/\.\d+$/, '');
}

/** Lays the API's field errors beside their fields; what has no field is said of the whole form. */
export function showProblem<T extends FieldValues>(
  error: unknown,
  setError: UseFormSetError<T>,
  { prefix = '', known }: { readonly prefix?: string; readonly known?: (name: string) => boolean } = {},
): void {
  const errors = isProblem(error) ? (error.problem.errors ?? []) : [];
  for (const { pointer, detail } of errors) {
    const name = pointer.replace(prefix, '').replace(/^\//, '').replaceAll('/', '.');
    const field = boxOf(name);
    const target = known && !known(field) ? 'root.server' : field;
    setError(target as Path<T>, { type: 'server', message: detail });
  }
  if (errors.length === 0) {
    setError('root.server', {
      type: 'server',
      message: error instanceof Error ? error.message : 'Not saved.',
    });
  }
}
