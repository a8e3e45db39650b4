import './app/zodSetup.ts';

import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';

import './app/app.css';
import { makeRouter } from './app/router.tsx';
import { startTheme } from './app/theme.ts';
import { makeQueryClient } from './data/queryClient.ts';

startTheme();
const root = document.getElementById('root');
if (root === null) throw new Error('index.html has no root');
const router = makeRouter();
const queryClient = makeQueryClient();
createRoot(root).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  </StrictMode>,
);
