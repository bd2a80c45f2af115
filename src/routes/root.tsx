import { Outlet, ScrollRestoration } from 'react-router-dom';
import { Shell } from '../components/Shell.tsx';

export function Component() {
  return (
    <Shell member={null} machines={[]}>
      <Outlet />
      <ScrollRestoration />
    </Shell>
  );
}
