import { cn } from '#client/lib/cn.ts';
import type { MaterialDto } from '#shared/schemas/material.ts';
import { countMaterials, type CategoryChoice } from './filter.ts';
import { CATEGORY_OPTIONS } from './words.ts';

interface CategoryTabsProps {
  materials: readonly MaterialDto[];
  choice: CategoryChoice;
  onChoice: (choice: CategoryChoice) => void;
}

/** Which kind of material is shown. */
export function CategoryTabs({ materials, choice, onChoice }: CategoryTabsProps) {
  const choices: { value: CategoryChoice; label: string }[] = [
    { value: 'all', label: 'All' },
    ...CATEGORY_OPTIONS,
    { value: 'own', label: 'Your own' },
  ];
  return (
    <div role="group" aria-label="Kind of material" className="flex flex-wrap gap-x-4">
      {choices.map(({ value, label }) => {
        const count = countMaterials(materials, value);
        if (count === 0 && value !== 'all') return null;
        const chosen = value === choice;
        return (
          <button
            key={value}
            type="button"
            aria-pressed={chosen}
            onClick={() => onChoice(value)}
            className={cn(
              'min-h-row border-b-2',
              chosen ? 'border-ink font-semibold' : 'border-transparent text-graphite hover:text-ink',
            )}
          >
            {label} <span className="text-note font-normal text-graphite">{count}</span>
          </button>
        );
      })}
    </div>
  );
}
