import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { Button } from './Button.tsx';
import { PageTitle } from './PageTitle.tsx';
import { ProblemNote } from './ProblemNote.tsx';

/** A page that failed to load or to draw. Most often the server was updated or the network is gone. */
export function BrokenPage() {
  const error = useRouteError();
  const detail = isRouteErrorResponse(error)
    ? error.statusText
    : 'It may be that the network is gone, or that the program was updated since you opened it.';
  return (
    <div className="max-w-2xl space-y-6 p-4">
      <PageTitle>This page did not open</PageTitle>
      <ProblemNote problem={{ title: 'The page could not be shown', detail }} />
      <Button look="main" onClick={() => window.location.reload()}>
        Load it again
      </Button>
    </div>
  );
}
