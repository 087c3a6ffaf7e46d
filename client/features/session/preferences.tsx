import { useMutation, useQueryClient } from '@tanstack/react-query';
import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import { useToast } from '#client/components/ui/toast.tsx';
import { useTheme } from '#client/hooks/use-theme.ts';
import { requestJson } from '#client/lib/api.ts';
import { ChosenUnitsContext, storedUnits, storeUnits } from '#client/lib/chosen-units.ts';
import type { ChosenUnits } from '#shared/format/units.ts';
import type { Preferences, Theme } from '#shared/schemas/preferences.ts';
import type { SessionDto } from '#shared/schemas/session.ts';
import { sessionQuery, useSession } from './queries.ts';

interface ReaderPreferences {
  units: ChosenUnits;
  theme: Theme;
  setUnits: (units: ChosenUnits) => void;
  setTheme: (theme: Theme) => void;
}

const PreferencesContext = createContext<ReaderPreferences | null>(null);

/** How the reader wants to see everything, and how to change it. */
export function usePreferences(): ReaderPreferences {
  const preferences = useContext(PreferencesContext);
  if (!preferences) throw new Error('There are no preferences here.');
  return preferences;
}

/**
 * Units and theme: of the account for who is signed in, else of this browser, which also remembers the account's so
 * that the next visit begins with them.
 */
export function PreferencesProvider({ children }: { children: ReactNode }) {
  const { data: session } = useSession();
  const kept = session?.preferences;
  const [own, setOwn] = useState(storedUnits);
  const [theme, setDeviceTheme] = useTheme();
  const keep = useKeepPreferences();

  useEffect(() => {
    if (!kept) return;
    storeUnits(kept.units);
    setDeviceTheme(kept.theme);
  }, [kept, setDeviceTheme]);

  const units = kept?.units ?? own;
  const signedIn = kept !== undefined;
  const value = useMemo(
    (): ReaderPreferences => ({
      units,
      theme,
      setUnits: (next) => {
        storeUnits(next);
        setOwn(next);
        if (signedIn) keep({ units: next });
      },
      setTheme: (next) => {
        setDeviceTheme(next);
        if (signedIn) keep({ theme: next });
      },
    }),
    [units, theme, signedIn, keep, setDeviceTheme],
  );
  return (
    <PreferencesContext value={value}>
      <ChosenUnitsContext value={units}>{children}</ChosenUnitsContext>
    </PreferencesContext>
  );
}

/** Shows a choice at once and keeps it with the account; says so where that fails. */
function useKeepPreferences(): (changes: Partial<Preferences>) => void {
  const client = useQueryClient();
  const say = useToast();
  const { mutate } = useMutation({
    mutationFn: (changes: Partial<Preferences>) =>
      requestJson('/account', { method: 'PATCH', body: changes }),
    onMutate: (changes) => {
      client.setQueryData(sessionQuery.queryKey, (session): SessionDto | undefined =>
        session?.preferences ? { ...session, preferences: { ...session.preferences, ...changes } } : session,
      );
    },
    onError: (error) => {
      say(`Your choice holds here but is not kept with the account: ${error.message}`);
    },
    onSettled: () => client.invalidateQueries({ queryKey: ['account'] }),
  });
  return mutate;
}
