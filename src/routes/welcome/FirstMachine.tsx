import { PageTitle } from '../../components/PageTitle.tsx';
import { MachineForm } from '../bench/machine/MachineForm.tsx';

/** Without a machine there is no scale to draw anything to, so this step is not skipped. */
export function FirstMachine() {
  return (
    <div className="max-w-7xl space-y-6">
      <div className="space-y-2">
        <p className="label-narrow text-ink-soft">Step 1 of 2</p>
        <PageTitle>Your first machine</PageTitle>
        <p className="max-w-prose text-ink-soft">
          Choose its class, then measure the bed. The rest is filled in for the class and can wait.
        </p>
      </div>
      {/* Saving makes the bench hold a machine, and the page goes on by itself. */}
      <MachineForm machine={null} onSaved={() => window.scrollTo(0, 0)} />
    </div>
  );
}
