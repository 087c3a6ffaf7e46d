import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import type { Plan } from '#shared/core/plan.ts';
import { DRAWS, SEED, TOLERANCE, type DrawSettings } from './settings.ts';
import { WeighedPieces } from './weighed-pieces.tsx';

interface DrawsFieldsProps {
  plan: Plan;
  settings: DrawSettings;
  onSettings: (settings: DrawSettings) => void;
}

const within = (value: number | null, { min, max }: { min: number; max: number }): value is number =>
  value !== null && value >= min && value <= max;

/** How often, from which seed, and how much sheets scatter; kept in this browser. */
export function DrawsFields({ plan, settings, onSettings }: DrawsFieldsProps) {
  return (
    <div>
      <div className="grid grid-cols-2 gap-x-6">
        <NumberField
          label="Draws"
          quantity="count"
          suffix=""
          {...DRAWS}
          step={1_000}
          value={settings.draws}
          onChange={(draws) => within(draws, DRAWS) && onSettings({ ...settings, draws: Math.round(draws) })}
        />
        <NumberField
          label="Thickness of sheet ±"
          quantity="length"
          {...TOLERANCE}
          step={0.05}
          value={settings.thickness}
          onChange={(thickness) => within(thickness, TOLERANCE) && onSettings({ ...settings, thickness })}
        />
        <NumberField
          label="Seed"
          quantity="count"
          suffix=""
          {...SEED}
          value={settings.seed}
          onChange={(seed) => within(seed, SEED) && onSettings({ ...settings, seed: Math.round(seed) })}
        />
        <div className="pt-[1.375rem]">
          <Button onClick={() => onSettings({ ...settings, seed: (settings.seed + 1) % (SEED.max + 1) })}>
            Another seed
          </Button>
        </div>
      </div>
      <p className="max-w-prose text-note text-graphite">
        The same seed draws the same figures. Density scatters by the spread of each material, part by part;
        sheet evenly within its ±; an item by its own ±. Kept in this browser.
      </p>
      <WeighedPieces
        plan={plan}
        pieces={settings.pieces}
        onPieces={(pieces) => onSettings({ ...settings, pieces })}
      />
    </div>
  );
}
