import { useId, type ComponentProps } from 'react';
import { controlClass, describedBy, FieldFrame } from './FieldFrame';

interface TextFieldProps extends ComponentProps<'input'> {
  label: string;
  hint?: string;
  error?: string | undefined;
}

/** One line of input with its label, hint and error tied to it. */
export function TextField({ label, hint, error, className, ...rest }: TextFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} {...(hint ? { hint } : {})} {...(error ? { error } : {})}>
      <input
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        className={`${controlClass} ${className ?? ''}`}
      />
    </FieldFrame>
  );
}
