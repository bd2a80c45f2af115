import type { ReactNode } from 'react';
import { BottomBar } from './BottomBar.tsx';
import type { MachineChoice } from './MachineSelect.tsx';
import { Strip, type StripMember } from './Strip.tsx';

interface ShellProps {
  readonly member: StripMember | null;
  readonly machines: readonly MachineChoice[];
  readonly children: ReactNode;
}

/** What stands around every page. */
export function Shell({ member, machines, children }: ShellProps) {
  return (
    <div className="flex min-h-dvh flex-col">
      <a
        href="#content"
        className="fixed top-2 left-2 z-40 -translate-y-20 border-2 border-layout bg-paper px-4 py-2 font-semibold focus:translate-y-0"
      >
        Skip to the content
      </a>
      <Strip member={member} machines={machines} />
      <main
        id="content"
        tabIndex={-1}
        className="flex-1 px-4 pt-6 pb-24 focus:outline-none md:px-7 md:pb-12 print:p-0"
      >
        {children}
      </main>
      {member !== null && <BottomBar role={member.role} />}
    </div>
  );
}
