import type { ReactNode } from 'react';
import { Navigate, type RouteObject } from 'react-router-dom';
import { fetchWhy } from '#client/components/why/why-provider.tsx';
import { PlaceError } from './pages/glider/place-error.tsx';
import type { Place } from './paths.ts';

/** The places of a glider, each in a file of its own that is fetched when it is first opened, or ahead of that. */
const FILES: Record<Place, () => Promise<{ Component: () => ReactNode }>> = {
  drawing: async () => ({ Component: (await import('./pages/glider/drawing-page.tsx')).DrawingPage }),
  balance: async () => ({ Component: (await import('./pages/glider/balance-page.tsx')).BalancePage }),
  loading: async () => ({ Component: (await import('./pages/glider/loading-page.tsx')).LoadingPage }),
  trial: async () => ({ Component: (await import('./pages/glider/trial-page.tsx')).TrialPage }),
  built: async () => ({ Component: (await import('./pages/glider/built-page.tsx')).BuiltPage }),
  cut: async () => ({ Component: (await import('./pages/glider/cut-page.tsx')).CutPage }),
  flight: async () => ({ Component: (await import('./pages/glider/flight-page.tsx')).FlightPage }),
  sheets: async () => ({ Component: (await import('./pages/glider/sheets-page.tsx')).SheetsPage }),
  log: async () => ({ Component: (await import('./pages/glider/log-page.tsx')).LogPage }),
};

export function placeRoutes(places: readonly Place[]): RouteObject[] {
  const [first = 'drawing'] = places;
  return [
    { index: true, element: <Navigate to={first} replace /> },
    ...places.map((place): RouteObject => ({
      path: place,
      lazy: FILES[place],
      errorElement: <PlaceError />,
    })),
  ];
}

/** Long enough for the open place to be there first, ms. */
const SETTLED = 3_000;

/** Fetches the other places ahead, so that a lost connection leaves none of them shut; the answer stops it. */
export function fetchPlaces(places: readonly Place[]): () => void {
  const timer = setTimeout(() => {
    for (const fetchFile of [...places.map((place) => FILES[place]), fetchWhy]) {
      fetchFile().catch(() => undefined);
    }
  }, SETTLED);
  return () => clearTimeout(timer);
}
