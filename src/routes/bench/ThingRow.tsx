import type { ReactNode } from 'react';
import { RowActions } from './RowActions.tsx';

interface ThingRowProps {
  readonly name: string;
  readonly facts: string;
  readonly drawing?: ReactNode;
  readonly changeHref: string;
  readonly onRemove: () => void;
}

/** A bit or a piece of stock on its shelf. */
export function ThingRow({ name, facts, drawing, changeHref, onRemove }: ThingRowProps) {
  return (
    <li className="flex flex-wrap items-center gap-x-6 gap-y-1 border-b border-rule py-2">
      {drawing}
      <div className="min-w-0 flex-1 basis-64">
        <h3 className="text-base leading-6">{name}</h3>
        <p className="figures text-sm leading-5 text-ink-soft">{facts}</p>
      </div>
      <RowActions name={name} changeHref={changeHref} onRemove={onRemove} />
    </li>
  );
}
