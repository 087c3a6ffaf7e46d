import type { ReactNode } from 'react';
import { ApiError, NetworkError } from '#client/lib/api.ts';
import { Button } from './ui/button.tsx';

interface ErrorScreenProps {
  error: unknown;
  onRetry?: (() => void) | undefined;
  /** Where to go instead. */
  children?: ReactNode;
}

/** What went wrong, what it means for the reader's work, and what can be done. */
export function ErrorScreen({ error, onRetry, children }: ErrorScreenProps) {
  const { title, text, retry } = wording(error);
  return (
    <div role="alert" className="max-w-xl py-6">
      <h2 className="text-heading font-semibold">{title}</h2>
      <p className="mt-2">{text}</p>
      <div className="mt-5 flex flex-wrap items-center gap-3">
        {retry && onRetry && (
          <Button variant="primary" onClick={onRetry}>
            Try again
          </Button>
        )}
        {children}
      </div>
    </div>
  );
}

function wording(error: unknown): { title: string; text: string; retry: boolean } {
  if (error instanceof NetworkError) {
    return {
      title: 'The server cannot be reached',
      text: 'Check the connection and try again. Edits made meanwhile are kept on this device.',
      retry: true,
    };
  }
  if (error instanceof ApiError) {
    switch (error.status) {
      case 401:
        return { title: 'You are signed out', text: 'Sign in to see this.', retry: false };
      case 403:
        return { title: 'Not yours to open', text: error.message, retry: false };
      case 404:
        return {
          title: 'Nothing here',
          text: 'It does not exist, was deleted, or belongs to somebody who has not shared it with you.',
          retry: false,
        };
      case 429:
        return {
          title: 'Too many requests',
          text: `${error.message} Wait a moment and try again.`,
          retry: true,
        };
      case 503:
        return {
          title: 'The server is busy',
          text: 'It will be back shortly. Try again in a moment.',
          retry: true,
        };
    }
  }
  return {
    title: 'Something went wrong',
    text:
      error instanceof Error && error.message ? error.message : 'This part of the page could not be shown.',
    retry: true,
  };
}
