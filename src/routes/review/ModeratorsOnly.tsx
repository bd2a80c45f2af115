import { EmptyState } from '../../components/EmptyState.tsx';
import { LinkButton } from '../../components/LinkButton.tsx';

export function ModeratorsOnly() {
  return (
    <EmptyState title="This desk is for moderators" action={<LinkButton to="/">Open the loft</LinkButton>}>
      You can flag a design or a cut record from its sheet: a moderator then decides, and you are told.
    </EmptyState>
  );
}
