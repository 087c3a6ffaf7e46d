import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers.tsx';
import { createAppRouter } from './app/router.tsx';
import './styles/app.css';

// The page's security policy forbids code made from text, which zod would try and the browser complain of. zod is
// fetched later than this file and takes its settings from here.
Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });

const root = document.getElementById('root');
if (!root) throw new Error('The page has no root element.');

createRoot(root).render(
  <StrictMode>
    <Providers>
      <RouterProvider router={createAppRouter()} />
    </Providers>
  </StrictMode>,
);
