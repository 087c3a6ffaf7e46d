import type { GliderRole } from '#shared/schemas/glider.ts';
import { memberRole } from '#shared/schemas/sharing.ts';

const ROLE_WORDS: Record<GliderRole, { name: string; may: string }> = {
  owner: { name: 'Owner', may: 'does everything, shares it and hands it over' },
  builder: { name: 'Builder', may: 'draws, weighs, names states, keeps sheets and photos' },
  pilot: { name: 'Pilot', may: 'weighs, trims, signs first flights, keeps sheets and photos; does not draw' },
  reader: { name: 'Reader', may: 'looks at everything' },
};

export function roleName(role: GliderRole): string {
  return ROLE_WORDS[role].name;
}

export function roleMay(role: GliderRole): string {
  return ROLE_WORDS[role].may;
}

/** The roles that an owner may give. */
export const ROLE_OPTIONS = memberRole.options.map((value) => ({ value, label: roleName(value) }));
