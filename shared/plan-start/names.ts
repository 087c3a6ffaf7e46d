/** An id that is not taken: `spar`, `spar-2`, `spar-3` … */
export function freshId(wanted: string, taken: readonly string[]): string {
  const base = wanted.replace(/-\d+$/, '').slice(0, 56);
  if (!taken.includes(base)) return base;
  let n = 2;
  while (taken.includes(`${base}-${n}`)) n += 1;
  return `${base}-${n}`;
}

/** A name that is not taken: `Ribs`, `Ribs 2` … */
export function freshName(wanted: string, taken: readonly string[]): string {
  const base = wanted.replace(/ \d+$/, '').slice(0, 110);
  if (!taken.includes(base)) return base;
  let n = 2;
  while (taken.includes(`${base} ${n}`)) n += 1;
  return `${base} ${n}`;
}
