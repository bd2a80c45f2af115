import { lazy, Suspense, useState } from 'react';
import type { Design } from '#shared/api/designs.ts';
import { Button } from '../../components/Button.tsx';
import { WithdrawDialog } from './WithdrawDialog.tsx';

// The form and its schemas are fetched only by who edits.
const EditWordsDialog = lazy(() => import('./EditWordsDialog.tsx'));

/** For the owner and moderators: change the words, or withdraw the design. */
export function OwnerActions({ design }: { readonly design: Design }) {
  const [open, setOpen] = useState<'edit' | 'withdraw' | null>(null);
  const close = () => setOpen(null);
  return (
    <div className="flex flex-wrap gap-3">
      <Button onClick={() => setOpen('edit')}>Edit the words</Button>
      {design.withdrawnAt === undefined && (
        <Button look="danger" onClick={() => setOpen('withdraw')}>
          Withdraw
        </Button>
      )}
      {open === 'edit' && (
        <Suspense>
          <EditWordsDialog design={design} onClose={close} />
        </Suspense>
      )}
      <WithdrawDialog design={design} isOpen={open === 'withdraw'} onClose={close} />
    </div>
  );
}
