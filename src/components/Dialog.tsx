import { X } from 'lucide-react';
import { type ReactNode, useEffect, useId, useRef } from 'react';

interface DialogProps {
  readonly title: string;
  readonly isOpen: boolean;
  readonly onClose: () => void;
  readonly children: ReactNode;
  /** Buttons, the one that does it last. */
  readonly actions?: ReactNode;
}

/**
 * The browser's own modal dialog: it holds the focus, closes on Escape and needs no inline style, which
 * the content security policy forbids.
 */
export function Dialog({ title, isOpen, onClose, children, actions }: DialogProps) {
  const titleId = useId();
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const element = dialog.current;
    if (element === null) return;
    if (isOpen && !element.open) element.showModal();
    if (!isOpen && element.open) element.close();
  }, [isOpen]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      onClose={onClose}
      className="m-auto max-h-[calc(100dvh-2rem)] w-[min(40rem,calc(100vw-2rem))] border-2 border-ink bg-paper p-0 text-ink shadow-overlay"
    >
      {isOpen && (
        <>
          <div className="flex items-start justify-between gap-4 border-b border-ink py-2 pr-2 pl-5">
            <h2 id={titleId} className="py-1.5 text-lg leading-7">
              {title}
            </h2>
            <button
              type="button"
              onClick={onClose}
              aria-label="Close"
              className="grid size-10 shrink-0 place-items-center hover:bg-film"
            >
              <X size={20} strokeWidth={1.5} aria-hidden="true" />
            </button>
          </div>
          <div className="p-5">{children}</div>
          {actions !== undefined && (
            <div className="flex flex-wrap justify-end gap-3 border-t border-rule p-4">{actions}</div>
          )}
        </>
      )}
    </dialog>
  );
}
