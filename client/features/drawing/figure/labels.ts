/** A word beside a line of the drawing; it may stand a little off its line, but not on another word. */
export interface Label {
  text: string;
  /** px of the line that it belongs to */
  at: number;
  tone: 'pencil' | 'graphite' | 'ink' | 'red';
}

/** Least distance of two lines of small type, px. */
const APART = 14;

/** The labels with places at which none lies on another, each as near to its line as that allows, inside the paper. */
export function spread(labels: readonly Label[], low: number, high: number): (Label & { place: number })[] {
  const sorted = [...labels].sort((a, b) => a.at - b.at);
  const places = sorted.map(({ at }) => Math.min(high, Math.max(low, at)));
  // Pushed down in order, then back up from the bottom edge.
  for (let i = 1; i < places.length; i++) {
    places[i] = Math.max(places[i] ?? 0, (places[i - 1] ?? 0) + APART);
  }
  for (let i = places.length - 1; i >= 0; i--) {
    const below = i === places.length - 1 ? high : (places[i + 1] ?? high) - APART;
    places[i] = Math.min(places[i] ?? 0, below);
  }
  return sorted.map((label, i) => ({ ...label, place: places[i] ?? label.at }));
}
