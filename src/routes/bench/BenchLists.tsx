import { sentenceOf } from '../../api/problem-error.ts';
import { PageTitle } from '../../components/PageTitle.tsx';
import { ProblemNote } from '../../components/ProblemNote.tsx';
import { UndoBar } from '../../components/UndoBar.tsx';
import { BitList } from './BitList.tsx';
import { MachineList } from './MachineList.tsx';
import { StockList } from './StockList.tsx';
import { useRemoval } from './use-removal.ts';

export function BenchLists() {
  const removal = useRemoval();
  return (
    <div className="max-w-6xl space-y-10">
      <div>
        <PageTitle>Bench</PageTitle>
        <p className="text-ink-soft">What you cut with. Only you see it; every fit answer rests on it.</p>
      </div>
      {removal.failure !== null && (
        <ProblemNote problem={{ title: 'Not removed', detail: sentenceOf(removal.failure) }} />
      )}
      <MachineList removal={removal} />
      <BitList removal={removal} />
      <StockList removal={removal} />
      {removal.pending !== null && (
        <UndoBar
          key={removal.pending.id}
          message={`${removal.pending.name} removed`}
          onUndo={removal.undo}
          onClose={removal.close}
        />
      )}
    </div>
  );
}
