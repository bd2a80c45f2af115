import { Check, Copy } from 'lucide-react';
import { useRef, useState } from 'react';
import type { InvitationMade } from '#shared/api/people.ts';
import { Button } from '../../components/Button.tsx';
import { TextField } from '../../components/TextField.tsx';
import { roleLabels } from '../../words/labels.ts';
import { sayDay } from '../../words/say-day.ts';

/** The link, this once: only its hash is kept. */
export function MadeLink({ made }: { readonly made: InvitationMade }) {
  const [copied, setCopied] = useState<'no' | 'yes' | 'by hand'>('no');
  const field = useRef<HTMLInputElement>(null);
  const copy = async () => {
    field.current?.select();
    try {
      await navigator.clipboard.writeText(made.link);
      setCopied('yes');
    } catch {
      // No clipboard on plain http: the link is marked, and the keyboard copies it.
      setCopied('by hand');
    }
  };
  const Icon = copied === 'yes' ? Check : Copy;
  return (
    <div className="space-y-3 border-2 border-pine bg-paper p-4">
      <p role="status">
        <strong>Invitation made</strong> for one {roleLabels[made.role].toLowerCase()}, good until{' '}
        {sayDay(made.expiresAt)}. Copy the link now: it is not shown again.
      </p>
      <div className="flex flex-wrap items-end gap-3">
        <div className="min-w-0 flex-1 basis-72">
          <TextField
            label="Link"
            ref={field}
            readOnly
            value={made.link}
            onFocus={(event) => event.target.select()}
            className="figures text-sm"
          />
        </div>
        <Button look="main" onClick={() => void copy()}>
          <Icon size={18} strokeWidth={1.5} aria-hidden="true" />
          {copied === 'yes' ? 'Copied' : 'Copy link'}
        </Button>
      </div>
      {copied === 'by hand' && (
        <p role="status" className="text-sm text-ink-soft">
          The browser did not let us copy. The link is marked: press Ctrl+C, or hold it on a phone.
        </p>
      )}
    </div>
  );
}
