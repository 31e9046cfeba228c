import { type ReactNode, useId } from 'react';

type Control = { id: string; 'aria-describedby'?: string; 'aria-invalid'?: true };

type FieldProps = {
  label: string;
  /** Shown behind the label, such as "rad/s²". */
  unit?: string;
  hint?: string | undefined;
  error?: string | undefined;
  className?: string;
  children: (control: Control) => ReactNode;
};

/** A labelled control with its unit, its hint and its error, tied together for screen readers. */
export function Field({ label, unit, hint, error, className = '', children }: FieldProps) {
  const id = useId();
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : '']
    .filter(Boolean)
    .join(' ');
  return (
    <div className={className}>
      <label htmlFor={id} className="block text-sm font-bold">
        {label}
        {unit !== undefined && <span className="font-normal text-muted"> {unit}</span>}
      </label>
      <div className="mt-1">
        {children({
          id,
          ...(described === '' ? {} : { 'aria-describedby': described }),
          ...(error ? { 'aria-invalid': true as const } : {}),
        })}
      </div>
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-sm text-muted">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 text-sm text-lost">
          {error}
        </p>
      )}
    </div>
  );
}
