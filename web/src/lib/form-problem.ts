import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { Problem } from '#shared/problem.ts';

/** `#/price/minor` → `price.minor`, as react-hook-form names fields. */
export const fieldName = (pointer: string): string =>
  pointer
    .replace(/^#\/?/, '')
    .split('/')
    .map((part) => decodeURIComponent(part).replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.');

export const messageOf = (error: unknown): string =>
  error instanceof Error ? error.message : 'The page met a fault of its own. Reload it and try again.';

/** Puts a problem's mistakes beside their fields; what belongs to no field goes above the form. */
export function showProblem<T extends FieldValues>(
  form: UseFormReturn<T>,
  error: unknown,
  prefix = '',
): void {
  const mistakes = error instanceof Problem ? error.errors : [];
  let isPlaced = false;
  for (const { pointer, detail } of mistakes) {
    const name = fieldName(pointer);
    const own = prefix && name.startsWith(prefix) ? name.slice(prefix.length) : name;
    const top = own.split('.')[0] ?? '';
    if (own !== '' && Object.hasOwn(form.getValues(), top)) {
      form.setError(own as FieldPath<T>, { type: 'server', message: detail }, { shouldFocus: !isPlaced });
      isPlaced = true;
    }
  }
  if (!isPlaced) form.setError('root', { type: 'server', message: messageOf(error) });
}
