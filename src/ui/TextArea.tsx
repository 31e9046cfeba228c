import type { ComponentPropsWithRef } from 'react';
import { controlClass } from './controlClass.ts';
import { Field } from './Field.tsx';

type TextAreaProps = ComponentPropsWithRef<'textarea'> & {
  label: string;
  hint?: string | undefined;
  error?: string | undefined;
};

export function TextArea({ label, hint, error, className = '', ...area }: TextAreaProps) {
  return (
    <Field label={label} hint={hint} error={error} className={className}>
      {(control) => <textarea rows={3} {...area} {...control} className={controlClass} />}
    </Field>
  );
}
