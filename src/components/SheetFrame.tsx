import type { ReactNode } from 'react';

const columns = ['1', '2', '3', '4', '5', '6'];
const rows = ['A', 'B', 'C', 'D'];

const zone = 'figures flex items-center justify-center text-[0.625rem] leading-none text-ink-soft';

function ColumnZones({ className }: { readonly className: string }) {
  return (
    <div className={`grid h-4 grid-cols-6 divide-x divide-ink ${className}`}>
      {columns.map((name) => (
        <span key={name} className={zone}>
          {name}
        </span>
      ))}
    </div>
  );
}

function RowZones({ className }: { readonly className: string }) {
  return (
    <div className={`grid w-4 grid-rows-4 divide-y divide-ink ${className}`}>
      {rows.map((name) => (
        <span key={name} className={zone}>
          {name}
        </span>
      ))}
    </div>
  );
}

/** The frame of a drawing sheet with its zones (ISO 5457): a thin edge, the zones, a thick frame. */
export function SheetFrame({ children }: { readonly children: ReactNode }) {
  return (
    <div className="relative border border-ink bg-paper p-4">
      <div aria-hidden="true">
        <ColumnZones className="absolute inset-x-4 top-0" />
        <ColumnZones className="absolute inset-x-4 bottom-0" />
        <RowZones className="absolute inset-y-4 left-0" />
        <RowZones className="absolute inset-y-4 right-0" />
      </div>
      <div className="outline-2 outline-ink">{children}</div>
    </div>
  );
}
