import './app.css';
import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { MachineProvider } from './machine/machine-in-use.tsx';
import { queryClient } from './query-client.ts';
import { router } from './router.tsx';
import { ThemeProvider } from './theme/theme-context.tsx';
import { UnitsProvider } from './units/units-context.tsx';

const place = document.getElementById('root');
if (place === null) throw new Error('index.html has no #root');

createRoot(place).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <ThemeProvider>
        <UnitsProvider>
          <MachineProvider>
            <RouterProvider router={router} />
          </MachineProvider>
        </UnitsProvider>
      </ThemeProvider>
    </QueryClientProvider>
  </StrictMode>,
);
