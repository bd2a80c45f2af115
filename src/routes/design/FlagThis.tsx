import { Flag } from 'lucide-react';
import { useState } from 'react';
import type { Design } from '#shared/api/designs.ts';
import type { Me } from '#shared/api/people.ts';
import { Button } from '../../components/Button.tsx';
import { FlagDialog } from './FlagDialog.tsx';

interface FlagThisProps {
  readonly design: Design;
  readonly me: Me;
  /** The record that the dialog opens with; null for the revision itself. */
  readonly recordId: string | null;
}

export function FlagThis({ design, me, recordId }: FlagThisProps) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <Button onClick={() => setIsOpen(true)}>
        <Flag size={18} strokeWidth={1.5} aria-hidden="true" />
        Flag this
      </Button>
      {isOpen && (
        <FlagDialog
          design={design}
          recordId={recordId}
          mayDecide={me.role !== 'member' && me.id !== design.owner.id}
          onClose={() => setIsOpen(false)}
        />
      )}
    </>
  );
}
