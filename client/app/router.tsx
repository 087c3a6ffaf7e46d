import { createBrowserRouter, Navigate, type RouteObject } from 'react-router-dom';
import { Layout } from './layout.tsx';
import { ErrorPage } from './pages/error-page.tsx';
import { NotFoundPage } from './pages/not-found-page.tsx';

/** The places of a glider, each in a file of its own that is fetched when it is first opened. */
const drawing: RouteObject = {
  path: 'drawing',
  lazy: async () => ({ Component: (await import('./pages/glider/drawing-page.tsx')).DrawingPage }),
};
const balance: RouteObject = {
  path: 'balance',
  lazy: async () => ({ Component: (await import('./pages/glider/balance-page.tsx')).BalancePage }),
};
const loading: RouteObject = {
  path: 'loading',
  lazy: async () => ({ Component: (await import('./pages/glider/loading-page.tsx')).LoadingPage }),
};
const trial: RouteObject = {
  path: 'trial',
  lazy: async () => ({ Component: (await import('./pages/glider/trial-page.tsx')).TrialPage }),
};
const sheets: RouteObject = {
  path: 'sheets',
  lazy: async () => ({ Component: (await import('./pages/glider/sheets-page.tsx')).SheetsPage }),
};
const first: RouteObject = { index: true, element: <Navigate to="drawing" replace /> };

const routes: RouteObject[] = [
  {
    element: <Layout />,
    errorElement: <ErrorPage />,
    // Nothing is shown before the first place is there; the frame itself comes with the first file.
    hydrateFallbackElement: <></>,
    children: [
      {
        errorElement: <ErrorPage />,
        children: [
          {
            index: true,
            lazy: async () => ({ Component: (await import('./pages/home-page.tsx')).HomePage }),
          },
          {
            path: 'sign-in',
            lazy: async () => ({ Component: (await import('./pages/sign-in-page.tsx')).SignInPage }),
          },
          {
            path: 'sign-up',
            lazy: async () => ({ Component: (await import('./pages/sign-up-page.tsx')).SignUpPage }),
          },
          {
            path: 'bench',
            lazy: async () => ({ Component: (await import('./pages/bench-page.tsx')).BenchPage }),
          },
          {
            path: 'materials',
            lazy: async () => ({ Component: (await import('./pages/materials-page.tsx')).MaterialsPage }),
          },
          {
            path: 'gliders/:id',
            lazy: async () => ({
              Component: (await import('./pages/glider/glider-layout.tsx')).GliderLayout,
            }),
            children: [first, drawing, balance, loading, trial, sheets],
          },
          {
            path: 'sample',
            lazy: async () => ({
              Component: (await import('./pages/glider/sample-layout.tsx')).SampleLayout,
            }),
            children: [first, drawing, balance, loading, trial],
          },
          {
            path: 'sheets/:sheetId',
            lazy: async () => ({ Component: (await import('./pages/sheet-page.tsx')).SheetPage }),
          },
          { path: '*', element: <NotFoundPage /> },
        ],
      },
    ],
  },
];

export function createAppRouter() {
  return createBrowserRouter(routes);
}
