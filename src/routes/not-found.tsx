import { EmptyState } from '../components/EmptyState.tsx';
import { LinkButton } from '../components/LinkButton.tsx';
import { PageTitle } from '../components/PageTitle.tsx';

export function Component() {
  return (
    <>
      <PageTitle>No sheet at this address</PageTitle>
      <EmptyState title="Nothing is filed here" action={<LinkButton to="/">Open the loft</LinkButton>}>
        The address may be mistyped, or the design was withdrawn.
      </EmptyState>
    </>
  );
}
