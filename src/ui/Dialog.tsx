import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

type DialogProps = {
  title: string;
  description?: string;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  children: ReactNode;
};

/** A question that must be answered first; Escape and a click beside it leave without change. */
export function Dialog({ title, description, open, onOpenChange, children }: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 bg-[rgb(0_0_0/0.45)]" />
        <Radix.Content
          {...(description === undefined ? { 'aria-describedby': undefined } : {})}
          className="fixed top-1/2 left-1/2 max-h-[90vh] w-[min(34rem,calc(100vw-2rem))] -translate-x-1/2 -translate-y-1/2 overflow-y-auto rounded-lg border border-line bg-paper p-5 text-ink shadow-xl"
        >
          <Radix.Title className="text-lg font-bold">{title}</Radix.Title>
          {description !== undefined && (
            <Radix.Description className="mt-1 text-muted">{description}</Radix.Description>
          )}
          <div className="mt-4">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
