import { useId, type ComponentProps } from 'react';
import { controlClass, describedBy, FieldFrame } from './FieldFrame';

interface SelectFieldProps extends ComponentProps<'select'> {
  label: string;
  hint?: string;
  error?: string | undefined;
  options: readonly { value: string; label: string }[];
  /** Shown while nothing is chosen. */
  placeholder?: string;
}

/** A choice from a list, on the browser's own control. */
export function SelectField({
  label,
  hint,
  error,
  options,
  placeholder,
  className,
  ...rest
}: SelectFieldProps) {
  const id = useId();
  return (
    <FieldFrame id={id} label={label} {...(hint ? { hint } : {})} {...(error ? { error } : {})}>
      <select
        {...rest}
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, hint, error)}
        className={`${controlClass} ${className ?? ''}`}
      >
        {placeholder !== undefined && <option value="">{placeholder}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
