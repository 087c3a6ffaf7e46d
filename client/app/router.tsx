import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { Layout } from './layout.tsx';
import { ErrorPage } from './pages/error-page.tsx';
import { NotFoundPage } from './pages/not-found-page.tsx';
import { PLACES, SAMPLE_PLACES, SHARED_PLACES } from './paths.ts';
import { placeRoutes } from './place-routes.tsx';

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
            path: 'start',
            lazy: async () => ({ Component: (await import('./pages/start-page.tsx')).StartPage }),
          },
          {
            path: 'materials',
            lazy: async () => ({ Component: (await import('./pages/materials-page.tsx')).MaterialsPage }),
          },
          {
            path: 'rack',
            lazy: async () => ({ Component: (await import('./pages/rack-page.tsx')).RackPage }),
          },
          {
            path: 'rack/labels',
            lazy: async () => ({ Component: (await import('./pages/rack-labels-page.tsx')).RackLabelsPage }),
          },
          {
            path: 'rack/:id',
            lazy: async () => ({ Component: (await import('./pages/rack-piece-page.tsx')).RackPiecePage }),
          },
          {
            path: 'forgot-password',
            lazy: async () => ({
              Component: (await import('./pages/forgot-password-page.tsx')).ForgotPasswordPage,
            }),
          },
          {
            path: 'reset-password/:token',
            lazy: async () => ({
              Component: (await import('./pages/reset-password-page.tsx')).ResetPasswordPage,
            }),
          },
          {
            path: 'verify-email/:token',
            lazy: async () => ({
              Component: (await import('./pages/verify-email-page.tsx')).VerifyEmailPage,
            }),
          },
          {
            path: 'invitations/:token',
            lazy: async () => ({ Component: (await import('./pages/invitation-page.tsx')).InvitationPage }),
          },
          {
            path: 'account',
            lazy: async () => ({ Component: (await import('./pages/account-page.tsx')).AccountPage }),
          },
          {
            path: 'shared/:token',
            lazy: async () => ({
              Component: (await import('./pages/glider/shared-layout.tsx')).SharedLayout,
            }),
            children: placeRoutes(SHARED_PLACES),
          },
          {
            path: 'gliders/:id/sharing',
            lazy: async () => ({ Component: (await import('./pages/sharing-page.tsx')).SharingPage }),
          },
          {
            path: 'gliders/:id',
            lazy: async () => ({
              Component: (await import('./pages/glider/glider-layout.tsx')).GliderLayout,
            }),
            children: placeRoutes(PLACES),
          },
          {
            path: 'sample',
            lazy: async () => ({
              Component: (await import('./pages/glider/sample-layout.tsx')).SampleLayout,
            }),
            children: placeRoutes(SAMPLE_PLACES),
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
