import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import { problemIn } from '../problemWords';

/** Ties the reasons of a refused request to the fields they name; the first of them takes the focus. */
export function setFieldErrors<Values extends FieldValues>(
  form: UseFormReturn<Values>,
  error: unknown,
): void {
  const fields = new Set(Object.keys(form.getValues()));
  const named = (problemIn(error)?.errors ?? []).filter(({ path }) => fields.has(path.split('.')[0] ?? ''));
  named.forEach(({ path, says }, index) =>
    form.setError(path as FieldPath<Values>, { type: 'server', message: says }, { shouldFocus: index === 0 }),
  );
}
