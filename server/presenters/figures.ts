import type { GliderFigures } from '#shared/schemas/glider.ts';

export function presentFigures({ mass, percentMac, wingLoading }: GliderFigures): GliderFigures {
  return { mass, percentMac, wingLoading };
}
