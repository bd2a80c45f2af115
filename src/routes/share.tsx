import { PageTitle } from '../components/PageTitle.tsx';

export function Component() {
  return <PageTitle>Share</PageTitle>;
}
