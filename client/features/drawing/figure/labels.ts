/** A word beside a line of the drawing; it may stand a little off its line, but not on another word. */
export interface Label {
  text: string;
  /** px of the line that it belongs to */
  at: number;
  tone: 'pencil' | 'graphite' | 'ink' | 'red';
}

/** Least distance of two lines of small type, px. */
const APART = 14;

interface Cluster {
  labels: Label[];
  top: number;
}

/**
 * The labels with places at which none lies on another, inside the paper. Words that would touch are stacked about
 * the middle of their lines, so that none strays far.
 */
export function spread(labels: readonly Label[], low: number, high: number): (Label & { place: number })[] {
  const clusters: Cluster[] = [];
  for (const label of [...labels].sort((a, b) => a.at - b.at)) {
    let cluster = clusterOf([label], low, high);
    let before = clusters.at(-1);
    while (before && before.top + before.labels.length * APART > cluster.top) {
      clusters.pop();
      cluster = clusterOf([...before.labels, ...cluster.labels], low, high);
      before = clusters.at(-1);
    }
    clusters.push(cluster);
  }
  return clusters.flatMap(({ labels: stack, top }) =>
    stack.map((label, i) => ({ ...label, place: top + i * APART })),
  );
}

function clusterOf(labels: Label[], low: number, high: number): Cluster {
  const middle = labels.reduce((sum, { at }) => sum + at, 0) / labels.length;
  const reach = (labels.length - 1) * APART;
  return { labels, top: Math.max(low, Math.min(high - reach, middle - reach / 2)) };
}
