import { Link } from 'react-router-dom';

interface RowActionsProps {
  readonly name: string;
  readonly changeHref: string;
  readonly onRemove: () => void;
}

const look = 'inline-flex min-h-10 items-center px-2 font-semibold underline-offset-4 hover:underline';

export function RowActions({ name, changeHref, onRemove }: RowActionsProps) {
  return (
    <div className="-mx-2 flex shrink-0">
      <Link to={changeHref} aria-label={`Change ${name}`} className={`${look} text-layout`}>
        Change
      </Link>
      <button type="button" aria-label={`Remove ${name}`} onClick={onRemove} className={`${look} text-brick`}>
        Remove
      </button>
    </div>
  );
}
