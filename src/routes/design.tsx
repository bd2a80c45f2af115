import { PageTitle } from '../components/PageTitle.tsx';

export function Component() {
  return <PageTitle>Design</PageTitle>;
}
