import type { ComponentPropsWithRef } from 'react';
import { controlClass } from './controlClass.ts';
import { Field } from './Field.tsx';

type TextFieldProps = ComponentPropsWithRef<'input'> & {
  label: string;
  unit?: string;
  hint?: string | undefined;
  error?: string | undefined;
};

/** One line of text, or a number with its unit. */
export function TextField({ label, unit, hint, error, className = '', ...input }: TextFieldProps) {
  return (
    <Field
      label={label}
      hint={hint}
      error={error}
      className={className}
      {...(unit ? { unit } : {})}
    >
      {(control) => <input type="text" {...input} {...control} className={controlClass} />}
    </Field>
  );
}
