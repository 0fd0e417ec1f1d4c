import './app/zod-without-eval';
import { QueryClientProvider } from '@tanstack/react-query';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import './app/notebook.css';
import { queryClient } from './app/query-client';
import { router } from './app/router';

const place = document.getElementById('notebook');
if (!place) throw new Error('The page has no place for the notebook.');

createRoot(place).render(
  <StrictMode>
    <QueryClientProvider client={queryClient}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  </StrictMode>,
);
