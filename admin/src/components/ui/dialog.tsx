import { Dialog, DialogBackdrop, DialogPanel, DialogTitle } from '@headlessui/react';
import type { ReactNode, RefObject } from 'react';

/** A question that must be answered before anything else: the focus goes in, stays, and returns. */
export function Question({
  open,
  onClose,
  title,
  children,
  actions,
  first,
}: {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly title: string;
  readonly children?: ReactNode;
  readonly actions: ReactNode;
  /** What takes the focus; the first control where it is not given. */
  readonly first?: RefObject<HTMLElement | null>;
}) {
  if (!open) return null;
  // Gone at once when it closes, and not when a transition has ended: whoever goes on from it takes the focus then.
  return (
    <Dialog static open onClose={onClose} initialFocus={first} className="relative z-40">
      <DialogBackdrop className="fixed inset-0 bg-ink/40" />
      <div className="fixed inset-0 overflow-y-auto p-4">
        <div className="flex min-h-full items-center justify-center">
          <DialogPanel className="w-full max-w-lg rounded-sm bg-sheet p-6 shadow-dialog">
            <DialogTitle className="title text-title-28">{title}</DialogTitle>
            {children && <div className="mt-3 space-y-3 text-table">{children}</div>}
            <div className="mt-6 flex flex-wrap gap-3">{actions}</div>
          </DialogPanel>
        </div>
      </div>
    </Dialog>
  );
}
