import { QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ToastProvider } from '#client/components/ui/toast.tsx';
import { PreferencesProvider } from '#client/features/session/preferences.tsx';
import { createQueryClient } from '#client/lib/query-client.ts';

export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(createQueryClient);
  return (
    <QueryClientProvider client={client}>
      <ToastProvider>
        <PreferencesProvider>{children}</PreferencesProvider>
      </ToastProvider>
    </QueryClientProvider>
  );
}
