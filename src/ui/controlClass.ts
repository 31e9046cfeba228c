/** The look of text fields and selects; the border alone stands out 3:1. */
export const controlClass =
  'block w-full min-h-9 rounded-md border border-control bg-raised px-2.5 py-1.5 text-ink placeholder:text-muted aria-invalid:border-lost';
