/**
 * The faces that a skin, cap strip or covering lies on, each with its x/c limits in order. Without limits it lies
 * on the whole chord.
 * @example facesOf({ seat: 'wrap', start: 0.3, end: 0.1 }) // → [{ face: 'upper', from: 0, to: 0.3 }, { face: 'lower', from: 0, to: 0.1 }]
 */
export function facesOf(part: {
  seat: 'top' | 'bottom' | 'both' | 'wrap';
  start?: number;
  end?: number;
}): { face: 'upper' | 'lower'; from: number; to: number }[] {
  const [start, end] = [part.start ?? 0, part.end ?? 1];
  if (part.seat === 'wrap') {
    return [
      { face: 'upper', from: 0, to: start },
      { face: 'lower', from: 0, to: end },
    ];
  }
  const range = { from: Math.min(start, end), to: Math.max(start, end) };
  return (
    part.seat === 'both'
      ? (['upper', 'lower'] as const)
      : part.seat === 'top'
        ? (['upper'] as const)
        : (['lower'] as const)
  ).map((face) => ({ face, ...range }));
}
