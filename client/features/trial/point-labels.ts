/** Width of a letter of a note and height of a line, px. */
const LETTER = 6.4;
const LINE = 16;
const GAP = 11;
/** A label put a line further down may come to lie a rounding error too near: that is no overlap. */
const SLACK = 1e-6;

interface Label {
  x: number;
  y: number;
  textAnchor: 'start' | 'end';
}

/** Where the names of points go: beside them, on the side that has room, moved down where another one stands. */
export function pointLabels(
  points: readonly { x: number; y: number; name: string }[],
  width: number,
): Label[] {
  const taken: { from: number; to: number; y: number }[] = [];
  const labels = points.map((): Label => ({ x: 0, y: 0, textAnchor: 'start' }));
  const topDown = points.map((point, i) => ({ ...point, i })).sort((a, b) => a.y - b.y);
  for (const { x, y, name, i } of topDown) {
    const wide = name.length * LETTER;
    const right = x + GAP + wide <= width;
    const [from, to] = right ? [x + GAP, x + GAP + wide] : [x - GAP - wide, x - GAP];
    let free = y;
    const hit = () =>
      taken.find((one) => one.from < to && from < one.to && Math.abs(one.y - free) < LINE - SLACK);
    for (let other = hit(); other; other = hit()) free = other.y + LINE;
    taken.push({ from, to, y: free });
    labels[i] = { x: right ? from : to, y: free, textAnchor: right ? 'start' : 'end' };
  }
  return labels;
}
