import { Upload } from 'lucide-react';
import { type DragEvent, useEffect, useEffectEvent, useId, useRef, useState } from 'react';
import { Button } from './Button.tsx';
import { pastedSvg } from './pasted-svg.ts';
import { UploadProgress } from './UploadProgress.tsx';

interface DropZoneProps {
  readonly label: string;
  /** Says the limit before anything is sent. */
  readonly hint: string;
  readonly accept?: string;
  readonly onFile: (file: File) => void;
  /** What is on its way: its name, and how much of it has gone, 0 to 1. */
  readonly sending?: { readonly name: string; readonly share: number } | null;
  readonly onCancel?: () => void;
}

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || ['INPUT', 'TEXTAREA'].includes(target.tagName));

/** Takes one file: dropped, chosen, or pasted anywhere on the page. */
export function DropZone({
  label,
  hint,
  accept = '.svg,image/svg+xml',
  onFile,
  sending = null,
  onCancel,
}: DropZoneProps) {
  const hintId = useId();
  const input = useRef<HTMLInputElement>(null);
  const [isOver, setIsOver] = useState(false);
  const isBusy = sending !== null;

  const takePasted = useEffectEvent((event: ClipboardEvent) => {
    if (isBusy || isTyping(event.target)) return;
    const file = pastedSvg(event.clipboardData);
    if (file === null) return;
    event.preventDefault();
    onFile(file);
  });
  useEffect(() => {
    const listen = (event: ClipboardEvent) => takePasted(event);
    document.addEventListener('paste', listen);
    return () => document.removeEventListener('paste', listen);
  }, []);

  const drop = (event: DragEvent) => {
    event.preventDefault();
    setIsOver(false);
    const [file] = event.dataTransfer.files;
    if (file !== undefined && !isBusy) onFile(file);
  };

  return (
    <section
      aria-label={label}
      onDragOver={(event) => {
        event.preventDefault();
        setIsOver(true);
      }}
      onDragLeave={() => setIsOver(false)}
      onDrop={drop}
      data-over={isOver}
      className="border border-ink bg-paper p-1 data-[over=true]:outline-2 data-[over=true]:outline-layout"
    >
      <div className="flex min-h-56 flex-col items-center justify-center gap-3 border border-dashed border-ink-soft p-6 text-center">
        {sending === null ? (
          <>
            <Upload size={28} strokeWidth={1.25} aria-hidden="true" />
            <p className="text-lg leading-7 font-bold">{isOver ? 'Let go to read it' : label}</p>
            <Button look="main" aria-describedby={hintId} onClick={() => input.current?.click()}>
              Choose a file
            </Button>
            <p id={hintId} className="max-w-prose text-sm leading-5 text-ink-soft">
              {hint}
            </p>
          </>
        ) : (
          <UploadProgress name={sending.name} share={sending.share} onCancel={onCancel} />
        )}
        <input
          ref={input}
          type="file"
          accept={accept}
          aria-label={label}
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => {
            const [file] = event.target.files ?? [];
            // The same file may be chosen again after it was mended.
            event.target.value = '';
            if (file !== undefined) onFile(file);
          }}
        />
      </div>
    </section>
  );
}
