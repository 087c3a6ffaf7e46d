/**
 * What one field of a plan says of another. Works on unknown input, so that it can speak beside shape errors:
 * whatever is not of the expected shape is passed over here, for the shape itself has already been refused.
 */
export interface ReferenceIssue {
  path: (string | number)[];
  message: string;
}

type Loose = Record<string, unknown>;
const isRecord = (value: unknown): value is Loose =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const records = (value: unknown): Loose[] =>
  Array.isArray(value) ? value.map((v) => (isRecord(v) ? v : {})) : [];
const missing = (value: unknown) => value === undefined;

export function referenceIssues(plan: unknown): ReferenceIssue[] {
  if (!isRecord(plan)) return [];
  const materials = isRecord(plan['materials']) ? plan['materials'] : undefined;
  const surfaces = records(plan['surfaces']);
  const solids = records(plan['solids']);
  return [
    ...materialIssues(materials),
    ...duplicates(surfaces, 'key', ['surfaces']),
    ...surfaces.flatMap((surface, i) => surfaceIssues(surface, ['surfaces', i], materials)),
    ...duplicates(records(plan['items']), 'id', ['items']),
    ...duplicates(solids, 'id', ['solids']),
    ...solids.flatMap((solid, i) => [
      ...materialUse(solid, ['solids', i], materials, [
        'density',
        ...(solid['shape'] === 'plate' ? ['areal'] : []),
      ]),
      ...(solid['profile'] === 'tube' && missing(solid['wall'])
        ? [{ path: ['solids', i, 'wall'], message: 'A tube needs its wall thickness.' }]
        : []),
    ]),
  ];
}

function materialIssues(materials: Loose | undefined): ReferenceIssue[] {
  return Object.entries(materials ?? {}).flatMap(([key, material]) =>
    isRecord(material) && ['density', 'areal', 'spread'].every((field) => missing(material[field]))
      ? [{ path: ['materials', key], message: 'Must have a density, an areal mass or a spread.' }]
      : [],
  );
}

function duplicates(rows: Loose[], field: string, path: (string | number)[]): ReferenceIssue[] {
  const seen = new Set<unknown>();
  return rows.flatMap((row, i) => {
    const key = row[field];
    if (typeof key !== 'string' || !seen.has(key)) {
      seen.add(key);
      return [];
    }
    return [{ path: [...path, i, field], message: `“${key}” is used twice.` }];
  });
}

function surfaceIssues(
  surface: Loose,
  path: (string | number)[],
  materials: Loose | undefined,
): ReferenceIssue[] {
  const parts = records(surface['parts']);
  const at = (i: number) => [...path, 'parts', i];
  return [
    ...duplicates(parts, 'id', [...path, 'parts']),
    ...parts.flatMap((part, i) => [
      ...materialUse(part, at(i), materials, sold(part)),
      ...partIssues(part, at(i)),
      ...(surface['mirrored'] === false && part['side'] !== undefined && part['side'] !== 'both'
        ? [{ path: [...at(i), 'side'], message: 'Only a mirrored surface has a port and a starboard side.' }]
        : []),
    ]),
  ];
}

/** How the material of a part may be sold: by volume, by area, or by the area of its joints. */
function sold(part: Loose): string[] {
  switch (part['kind']) {
    case 'covering':
    case 'finish':
      return ['areal'];
    case 'glue':
      return part['method'] === 'joints' ? ['spread'] : ['spread', 'density', 'areal'];
    case 'tipBlock':
      return ['density'];
    default:
      return ['density', 'areal'];
  }
}

const NEEDS: Record<string, string> = {
  density: 'a density',
  areal: 'an areal mass',
  spread: 'a spread',
};

function materialUse(
  user: Loose,
  path: (string | number)[],
  materials: Loose | undefined,
  fields: string[],
): ReferenceIssue[] {
  const key = user['material'];
  if (typeof key !== 'string' || !materials) return [];
  if (!Object.hasOwn(materials, key)) {
    return [{ path: [...path, 'material'], message: `The plan has no material “${key}”.` }];
  }
  const material = materials[key];
  if (!isRecord(material) || fields.some((field) => !missing(material[field]))) return [];
  const need = fields.map((field) => NEEDS[field]).join(' or ');
  return [{ path: [...path, 'material'], message: `This needs a material with ${need}.` }];
}

function partIssues(part: Loose, path: (string | number)[]): ReferenceIssue[] {
  const issue = (field: string, message: string) => ({ path: [...path, field], message });
  const issues: ReferenceIssue[] = [];
  if (part['kind'] === 'strip') {
    const seat = part['seat'];
    const inside = seat === 'top' || seat === 'bottom' || seat === 'middle';
    if (inside && missing(part['at']))
      issues.push(issue('at', 'Must say where on the chord the strip lies.'));
    if (inside && missing(part['letIn']))
      issues.push(issue('letIn', 'Must say whether the strip is let in.'));
    if (part['profile'] === 'tube' && missing(part['wall']))
      issues.push(issue('wall', 'A tube needs its wall thickness.'));
  }
  if (part['kind'] === 'glue' && part['method'] === 'share' && missing(part['share'])) {
    issues.push(issue('share', 'Must say which share of the wood the glue weighs.'));
  }
  if (part['kind'] === 'ribs') issues.push(...ribIssues(part, issue));
  return issues;
}

function ribIssues(part: Loose, issue: (field: string, message: string) => ReferenceIssue): ReferenceIssue[] {
  const steps = ['from', 'to', 'count'] as const;
  const given = steps.filter((field) => !missing(part[field]));
  if (missing(part['stations'])) {
    if (given.length === 0) return [issue('stations', 'Must have stations, or from, to and count.')];
    return steps
      .filter((field) => missing(part[field]))
      .map((field) => issue(field, 'Ribs in equal steps need from, to and count.'));
  }
  return given.map((field) => issue(field, 'Give stations, or from, to and count, not both.'));
}
