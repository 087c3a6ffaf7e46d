import type { Pair, Part, Plan, SectionSpec, Surface } from '#shared/core/plan.ts';

/** The plan with every place moved aft by a distance. */
export function moved(plan: Plan, by: number): Plan {
  const aft = ([x, y, z]: [number, number, number]): [number, number, number] => [x + by, y, z];
  return {
    ...plan,
    surfaces: plan.surfaces.map((s) => ({ ...s, apex: aft(s.apex) })),
    items: plan.items.map((i) => ({ ...i, at: aft(i.at) })),
    solids: plan.solids.map((s) =>
      s.shape === 'bar'
        ? { ...s, from: aft(s.from), to: aft(s.to) }
        : { ...s, outline: s.outline.map(([x, z]): [number, number] => [x + by, z]) },
    ),
  };
}

/** The plan with every length times k; shares, angles and materials stay. */
export function scaled(plan: Plan, k: number): Plan {
  const pair = ([a, b]: Pair): Pair => [a * k, b * k];
  const vec = (v: [number, number, number]): [number, number, number] => [v[0] * k, v[1] * k, v[2] * k];
  const section = (spec: SectionSpec): SectionSpec => ('flat' in spec ? { flat: spec.flat * k } : spec);
  const optional = (v: number | undefined) => (v === undefined ? undefined : v * k);
  const part = (p: Part): Part => {
    const range = 'from' in p ? { from: (p.from ?? 0) * k, to: (p.to ?? 0) * k } : {};
    switch (p.kind) {
      case 'ribs':
        return {
          ...p,
          from: optional(p.from),
          to: optional(p.to),
          stations: p.stations?.map((s) => s * k),
          thickness: p.thickness * k,
        };
      case 'strip':
        return { ...p, ...range, width: pair(p.width), height: pair(p.height), wall: optional(p.wall) };
      case 'capStrips':
        return { ...p, ...range, width: p.width * k, thickness: p.thickness * k };
      case 'skin':
      case 'web':
        return { ...p, ...range, thickness: p.thickness * k };
      case 'tipBlock':
        return { ...p, length: p.length * k };
      case 'sheet':
        return { ...p, thickness: p.thickness * k };
      case 'covering':
      case 'finish':
        return { ...p, ...range };
      case 'glue':
        return p;
    }
  };
  return {
    ...plan,
    surfaces: plan.surfaces.map((s) => ({
      ...s,
      apex: vec(s.apex),
      panels: s.panels.map((p) => ({
        ...p,
        span: p.span * k,
        rootChord: p.rootChord * k,
        tipChord: p.tipChord * k,
        sweep: p.sweep * k,
        rootSection: section(p.rootSection),
        tipSection: section(p.tipSection),
      })),
      parts: s.parts.map(part),
    })),
    items: plan.items.map((i) => ({ ...i, at: vec(i.at) })),
    solids: plan.solids.map((s) =>
      s.shape === 'bar'
        ? {
            ...s,
            from: vec(s.from),
            to: vec(s.to),
            width: pair(s.width),
            height: pair(s.height),
            wall: optional(s.wall),
          }
        : {
            ...s,
            outline: s.outline.map(([x, z]): [number, number] => [x * k, z * k]),
            thickness: s.thickness * k,
            y: s.y * k,
          },
    ),
  };
}

/** The surface with its first panel cut at 3/7 of its span; only where both its sections are one. */
export function splitFirstPanel(surface: Surface): Surface {
  const [first, ...rest] = surface.panels;
  if (!first || JSON.stringify(first.rootSection) !== JSON.stringify(first.tipSection)) return surface;
  const share = 3 / 7;
  const chord = first.rootChord + share * (first.tipChord - first.rootChord);
  return {
    ...surface,
    panels: [
      { ...first, span: first.span * share, tipChord: chord, sweep: first.sweep * share },
      { ...first, span: first.span * (1 - share), rootChord: chord, sweep: first.sweep * (1 - share) },
      ...rest,
    ],
  };
}
