import { Link } from 'react-router-dom';

export interface Drawer {
  readonly value: string;
  readonly label: string;
  readonly count: number;
  readonly href: string;
  readonly isOpen: boolean;
}

/** The kinds of designs as drawer fronts; the open one is pulled out. */
export function PlanChest({ drawers }: { readonly drawers: readonly Drawer[] }) {
  return (
    <nav
      aria-label="Kinds of designs"
      className="border-2 border-ink bg-paper max-md:grid max-md:grid-cols-2"
    >
      {drawers.map(({ value, label, count, href, isOpen }) => (
        <Link
          key={value}
          to={href}
          aria-current={isOpen ? 'true' : undefined}
          className="group relative flex min-h-11 items-center justify-between gap-2 border-rule px-2 py-1 max-md:border-r max-md:border-b md:border-b md:border-ink md:px-3 md:last:border-b-0 aria-[current]:z-10 aria-[current]:bg-paper aria-[current]:outline-2 aria-[current]:-outline-offset-1 aria-[current]:outline-ink md:aria-[current]:translate-x-3 md:aria-[current]:border-b-transparent"
        >
          {isOpen && (
            <span
              aria-hidden="true"
              className="absolute inset-y-0 left-0 w-1.5 bg-layout md:-left-[13px] md:w-3 md:border-r-2 md:border-ink"
            />
          )}
          <span className="min-w-0 truncate border border-ink bg-film px-2 text-sm leading-6 group-hover:border-layout group-hover:text-layout group-aria-[current]:font-semibold max-md:ml-1.5">
            {label}
          </span>
          <span className="figures text-sm">{count}</span>
        </Link>
      ))}
    </nav>
  );
}
