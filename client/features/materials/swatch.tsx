import { hatchFill } from '#client/components/ui/hatch.tsx';
import type { MaterialDto } from '#shared/schemas/material.ts';

/** The drafting hatch of a material, as it is in every drawing. */
export function Swatch({ material }: { material: Pick<MaterialDto, 'category' | 'density'> }) {
  return (
    <svg width="36" height="18" aria-hidden="true" className="block shrink-0">
      <rect
        x="0.5"
        y="0.5"
        width="35"
        height="17"
        fill={hatchFill(material.category, material.density)}
        stroke="var(--graphite)"
      />
    </svg>
  );
}
