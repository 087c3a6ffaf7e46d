import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useSettled } from '#client/hooks/use-settled.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { rackQueries } from './queries.ts';

interface GliderSelectProps {
  /** the glider chosen; null for none */
  value: string | null;
  onValue: (id: string | null) => void;
  /** chosen from the first, and offered whatever is searched */
  now: StockPieceDto['reservedFor'];
  /** what no glider is called */
  none: string;
}

/** One of the gliders that the reader builds. */
export function GliderSelect({ value, onValue, now, none }: GliderSelectProps) {
  const [search, setSearch] = useState('');
  const { data = [], error } = useQuery({
    ...rackQueries.gliders(useSettled(search.trim(), 250)),
    placeholderData: (before) => before,
  });
  const others = data.filter(({ id }) => id !== now?.id);
  return (
    <div className="grid gap-x-4 sm:grid-cols-2">
      <Select
        label="Glider"
        options={[
          { value: '', label: none },
          ...[...(now ? [now] : []), ...others].map(({ id, name }) => ({ value: id, label: name })),
        ]}
        value={value ?? ''}
        onValue={(next) => onValue(next === '' ? null : next)}
        error={error?.message}
      />
      <TextField
        label="Find by name"
        type="search"
        value={search}
        onChange={(event) => setSearch(event.target.value)}
      />
    </div>
  );
}
