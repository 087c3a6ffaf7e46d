import { storedTheme } from '#client/hooks/use-theme.ts';
import { requestJson } from '#client/lib/api.ts';
import { storedUnits } from '#client/lib/chosen-units.ts';
import type { SessionDto } from '#shared/schemas/session.ts';

/** Hands what a visitor chose in this browser on to the account that was just made. */
export async function withDeviceChoices(session: SessionDto): Promise<SessionDto> {
  const { preferences } = await import('#shared/schemas/preferences.ts');
  const chosen = preferences.safeParse({ units: storedUnits(), theme: storedTheme() });
  if (!chosen.success || !session.user) return session;
  const usual = Object.keys(chosen.data.units).length === 0 && chosen.data.theme === 'system';
  if (usual) return session;
  try {
    await requestJson('/account', { method: 'PATCH', body: chosen.data });
    return { ...session, preferences: chosen.data };
  } catch {
    // The account is made; its choices can be made again.
    return session;
  }
}
