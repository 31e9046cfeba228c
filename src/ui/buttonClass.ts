export type ButtonLook = 'primary' | 'plain' | 'quiet' | 'danger';

const shared =
  'inline-flex min-h-9 items-center justify-center gap-2 rounded-md px-3 py-1.5 font-bold no-underline cursor-pointer disabled:cursor-not-allowed disabled:opacity-60 print:hidden';

const looks: Record<ButtonLook, string> = {
  primary: 'bg-accent text-on-accent hover:brightness-110',
  plain: 'border border-control bg-raised text-ink hover:bg-hover',
  quiet: 'text-accent hover:bg-hover',
  danger: 'border border-lost text-lost bg-raised hover:bg-hover',
};

/** The classes of a button, for links that look like one. */
export function buttonClass(look: ButtonLook = 'plain'): string {
  return `${shared} ${looks[look]}`;
}
