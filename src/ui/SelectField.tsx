import type { ComponentPropsWithRef } from 'react';
import { controlClass } from './controlClass.ts';
import { Field } from './Field.tsx';

type SelectFieldProps = ComponentPropsWithRef<'select'> & {
  label: string;
  hint?: string | undefined;
  error?: string | undefined;
  options: readonly (string | { value: string; text: string })[];
};

/** The browser's own select: every phone and screen reader knows how to work it. */
export function SelectField({
  label,
  hint,
  error,
  options,
  className = '',
  ...select
}: SelectFieldProps) {
  return (
    <Field label={label} hint={hint} error={error} className={className}>
      {(control) => (
        <select {...select} {...control} className={controlClass}>
          {options.map((option) => {
            const { value, text } =
              typeof option === 'string' ? { value: option, text: option } : option;
            return (
              <option key={value} value={value}>
                {text}
              </option>
            );
          })}
        </select>
      )}
    </Field>
  );
}
