import type { Theme } from '#shared/schemas/preferences.ts';

const THEMES: readonly { value: Theme; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

export function ThemeForm({ theme, onTheme }: { theme: Theme; onTheme: (theme: Theme) => void }) {
  return (
    <fieldset>
      <legend className="sr-only">Paper</legend>
      <div className="flex flex-wrap gap-x-6">
        {THEMES.map(({ value, label }) => (
          <label key={value} className="flex min-h-row items-center gap-2">
            <input
              type="radio"
              name="theme"
              checked={theme === value}
              onChange={() => onTheme(value)}
              className="size-4 accent-ink"
            />
            {label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
