import { useId, type ComponentProps } from 'react';
import { controlClass, describedBy, FieldFrame } from './FieldFrame';

interface WordsFieldProps extends ComponentProps<'textarea'> {
  label: string;
  hint?: string;
  error?: string | undefined;
}

/** Several lines of words: a reason, a note. */
export function WordsField({ label, hint, error, className, ...rest }: WordsFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} {...(hint ? { hint } : {})} {...(error ? { error } : {})}>
      <textarea
        rows={2}
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        className={`${controlClass} ${className ?? ''}`}
      />
    </FieldFrame>
  );
}
