import type { ReactNode } from 'react';
import { Navigate, useLocation } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { useSession } from './queries.ts';

interface RequireSessionProps {
  /** Address of the sign-in page that leads back to where the visitor wanted to go. */
  signInHref: (next: string) => string;
  children: ReactNode;
}

/** Sends a visitor to sign in and then back. */
export function RequireSession({ signInHref, children }: RequireSessionProps) {
  const query = useSession();
  const { pathname, search } = useLocation();
  return (
    <QueryView query={query}>
      {({ user }) => (user ? children : <Navigate to={signInHref(`${pathname}${search}`)} replace />)}
    </QueryView>
  );
}
