import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router';
import { createQueryClient } from './lib/query-client.ts';
import { startTheme } from './lib/theme.ts';
import { createRouter } from './routes.tsx';
import './styles/base.css';

startTheme();

const root = document.getElementById('root');
if (root === null) throw new Error('index.html has no element with the id root.');

const queryClient = createQueryClient();
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={createRouter(queryClient)} />
    </QueryClientProvider>
  </StrictMode>,
);
