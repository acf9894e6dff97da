import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './providers.tsx';
import { router } from './router.tsx';
import './styles.css';

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element "root"');

createRoot(root).render(
  <StrictMode>
    <Providers>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
);
