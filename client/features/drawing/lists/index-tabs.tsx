import type { Ref } from 'react';
import { Menu, MenuItem } from '#client/components/ui/menu.tsx';
import type { Plan, SurfaceRole } from '#shared/core/plan.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { sameTab, type Tab } from '../edits/line-id.ts';
import { surfaceTitle } from '../figure/plan-words.ts';
import { ROLES } from './surface-settings.tsx';

interface IndexTabsProps {
  plan: Plan;
  tab: Tab;
  onTab: (tab: Tab) => void;
  canEdit: boolean;
  onAdd: (role: SurfaceRole) => void;
  navRef: Ref<HTMLElement>;
}

const TAB =
  'min-h-row min-w-6 border-b-2 border-transparent px-0.5 pointer-coarse:min-w-11 text-graphite hover:text-ink ' +
  'aria-[current]:border-ink aria-[current]:font-semibold aria-[current]:text-pencil';

/** What the plan is made of: its surfaces, its solids, its items. */
export function IndexTabs({ plan, tab, onTab, canEdit, onAdd, navRef }: IndexTabsProps) {
  const tabs: { key: string; tab: Tab; label: string }[] = [
    // A surface may be renamed letter by letter; its place is what the tab is known by.
    ...plan.surfaces.map((surface, index) => ({
      key: `surface ${index}`,
      tab: { kind: 'surface' as const, index },
      label: surfaceTitle(surface),
    })),
    { key: 'solids', tab: { kind: 'solids' }, label: 'Solids' },
    { key: 'items', tab: { kind: 'items' }, label: 'Items' },
  ];
  return (
    <nav
      ref={navRef}
      aria-label="Parts of the plan"
      className="flex flex-wrap items-end gap-x-1.5 sm:gap-x-4"
    >
      {tabs.map(({ key, tab: own, label }) => (
        <button
          key={key}
          type="button"
          aria-current={sameTab(own, tab) ? 'true' : undefined}
          onClick={() => onTab(own)}
          className={TAB}
        >
          {label}
        </button>
      ))}
      {canEdit && plan.surfaces.length < LIMITS.surfaces.max && (
        <Menu
          align="start"
          trigger={
            <button
              type="button"
              aria-label="Add a surface"
              title="Add a surface"
              className="grid min-h-row min-w-row place-items-center rounded-md text-ink hover:bg-ink-wash"
            >
              +
            </button>
          }
        >
          {ROLES.map(({ value, label }) => (
            <MenuItem key={value} onSelect={() => onAdd(value)}>
              {label}
            </MenuItem>
          ))}
        </Menu>
      )}
    </nav>
  );
}
