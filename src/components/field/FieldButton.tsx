import type { ComponentProps } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { fieldButtonClass, type FieldLook } from './fieldButtonClass';

interface Looks {
  look?: FieldLook;
}

/** A button for gloved hands. */
export function FieldButton({ look = 'outlined', className, ...rest }: ComponentProps<'button'> & Looks) {
  return <button type="button" {...rest} className={fieldButtonClass(look, className)} />;
}

/** A link of the same size and look: it goes somewhere, it saves nothing. */
export function FieldLink({ look = 'outlined', className, ...rest }: LinkProps & Looks) {
  return <Link {...rest} className={fieldButtonClass(look, className)} />;
}
