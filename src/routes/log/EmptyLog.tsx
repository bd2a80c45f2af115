import { Button } from '../../components/Button.tsx';
import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';
import { isFiltered, type LogFilters } from './log-filters.ts';

interface EmptyLogProps {
  readonly filters: LogFilters;
  readonly onClear: () => void;
}

/** Nothing to list: because of the filters, or because nothing was cut yet. */
export function EmptyLog({ filters, onClear }: EmptyLogProps) {
  if (isFiltered(filters)) {
    return (
      <EmptyState
        title="No cut was recorded like that"
        action={
          <Button look="main" onClick={onClear}>
            Clear the filters
          </Button>
        }
      >
        Nothing in the log has this material, outcome and machine together.
      </EmptyState>
    );
  }
  if (filters.whose === 'club') {
    return (
      <EmptyState
        title="The club has recorded no cut yet"
        action={<LinkButton to="/">Open the loft</LinkButton>}
      >
        Every cut that a member records is listed here, clean or failed.
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="You have recorded no cut yet"
      action={
        <>
          <LinkButton to="/">Open the loft</LinkButton>
          <LinkButton look="line" to="/log?whose=club">
            Look at the club’s cuts
          </LinkButton>
        </>
      }
    >
      Take a design from the loft and cut it. Then press “Record a cut” on its sheet: it takes less than a
      minute.
    </EmptyState>
  );
}
