import { Button } from './Button.tsx';

interface UploadProgressProps {
  readonly name: string;
  /** 0 to 1; at 1 the server is reading. */
  readonly share: number;
  readonly onCancel: (() => void) | undefined;
}

export function UploadProgress({ name, share, onCancel }: UploadProgressProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100);
  return (
    <div className="w-full max-w-md space-y-3 text-left">
      <p className="flex items-baseline justify-between gap-4">
        <span className="min-w-0 truncate font-semibold">
          {percent < 100 ? `Sending ${name}` : `Reading ${name}`}
        </span>
        <span className="figures shrink-0 text-sm whitespace-nowrap">{percent} %</span>
      </p>
      <div
        role="progressbar"
        aria-label={`Sending ${name}`}
        aria-valuenow={percent}
        aria-valuemin={0}
        aria-valuemax={100}
        className="h-3 border border-ink bg-film"
      >
        <div className="h-full bg-layout" style={{ width: `${percent}%` }} />
      </div>
      {onCancel !== undefined && <Button onClick={onCancel}>Cancel</Button>}
    </div>
  );
}
