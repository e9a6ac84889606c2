'use client';

import { Dialog as Primitive } from 'radix-ui';
import { type ReactNode } from 'react';
import { Button } from './button';
import { classNames } from './class-names';
import { usePortalRoot } from './portal-root';

export type DialogProps = Readonly<{
  isOpen: boolean;
  onOpenChange: (isOpen: boolean) => void;
  title: string;
  /** One sentence on what this is for. */
  description?: ReactNode;
  children: ReactNode;
  className?: string;
}>;

/** What a dialog and a sheet share: the rest of the page waits, Escape and the close button leave it. */
function Over({ isOpen, onOpenChange, title, description, children, className }: DialogProps) {
  const portalRoot = usePortalRoot();
  return (
    <Primitive.Root open={isOpen} onOpenChange={onOpenChange}>
      <Primitive.Portal container={portalRoot}>
        <Primitive.Overlay className="fixed inset-0 z-40 bg-black/55" />
        <Primitive.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className={classNames(
            'appear fixed z-50 overflow-y-auto bg-panel p-5 text-ink shadow-2xl outline-none',
            className,
          )}
        >
          <header className="mb-5 flex items-start justify-between gap-4">
            <div>
              <Primitive.Title className="text-xl font-bold">{title}</Primitive.Title>
              {description ? (
                <Primitive.Description className="mt-1 text-soft">{description}</Primitive.Description>
              ) : null}
            </div>
            <Primitive.Close asChild>
              <Button variant="quiet" size="small">
                Close
              </Button>
            </Primitive.Close>
          </header>
          {children}
        </Primitive.Content>
      </Primitive.Portal>
    </Primitive.Root>
  );
}

/** Asks for something before anything else goes on. */
export function Dialog({ className, ...rest }: DialogProps) {
  const look = 'inset-x-4 top-[max(1rem,10vh)] mx-auto max-h-[80vh] max-w-lg rounded-lg border';
  return <Over {...rest} className={classNames(look, className)} />;
}

export type SheetProps = DialogProps & Readonly<{ side?: 'right' | 'bottom' }>;

const sides = {
  right: 'inset-y-0 right-0 w-[min(28rem,100vw)] border-l',
  bottom: 'inset-x-0 bottom-0 max-h-[85dvh] rounded-t-xl border-t pb-[max(1.25rem,env(safe-area-inset-bottom))]',
} as const;

/** Work beside the page it belongs to. */
export function Sheet({ side = 'right', className, ...rest }: SheetProps) {
  return <Over {...rest} className={classNames(sides[side], className)} />;
}
