import { createBrowserRouter } from 'react-router-dom';
import { BrokenPage } from './components/BrokenPage.tsx';
import { Skeleton } from './components/Skeleton.tsx';
import * as root from './routes/root.tsx';

// Pages are loaded when they are opened; the root is not, since every page stands in it.
export const router = createBrowserRouter([
  {
    path: '/',
    ...root,
    ErrorBoundary: BrokenPage,
    HydrateFallback: Skeleton,
    children: [
      {
        ErrorBoundary: BrokenPage,
        children: [
          { index: true, lazy: () => import('./routes/loft.tsx') },
          { path: 'designs/:slug', lazy: () => import('./routes/design.tsx') },
          { path: 'designs/:slug/record', lazy: () => import('./routes/record.tsx') },
          { path: 'log', lazy: () => import('./routes/log.tsx') },
          { path: 'share', lazy: () => import('./routes/share.tsx') },
          { path: 'bench', lazy: () => import('./routes/bench.tsx') },
          { path: 'welcome', lazy: () => import('./routes/welcome.tsx') },
          { path: 'members', lazy: () => import('./routes/members.tsx') },
          { path: 'review', lazy: () => import('./routes/review.tsx') },
          { path: 'review/:flag', lazy: () => import('./routes/review-flag.tsx') },
          { path: 'notices', lazy: () => import('./routes/notices.tsx') },
          { path: 'account', lazy: () => import('./routes/account.tsx') },
          { path: 'sign-in', lazy: () => import('./routes/sign-in.tsx') },
          { path: 'join/:code', lazy: () => import('./routes/join.tsx') },
          { path: '*', lazy: () => import('./routes/not-found.tsx') },
        ],
      },
    ],
  },
]);
