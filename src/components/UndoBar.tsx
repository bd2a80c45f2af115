import { X } from 'lucide-react';
import { Button } from './Button.tsx';

interface UndoBarProps {
  /** What was done, such as "Machine Shed router removed". */
  readonly message: string;
  readonly onUndo: () => void;
  readonly onClose: () => void;
}

/** Stays until it is answered or closed: no deadline for slow hands. */
export function UndoBar({ message, onUndo, onClose }: UndoBarProps) {
  return (
    <div
      role="status"
      className="fixed inset-x-4 bottom-20 z-30 mx-auto flex max-w-xl items-center gap-2 border-2 border-ink bg-paper p-2 pl-4 shadow-overlay md:bottom-6"
    >
      <span className="min-w-0 flex-1">{message}</span>
      <Button look="main" onClick={onUndo}>
        Undo
      </Button>
      <Button look="quiet" onClick={onClose} aria-label="Close">
        <X size={20} strokeWidth={1.5} aria-hidden="true" />
      </Button>
    </div>
  );
}
