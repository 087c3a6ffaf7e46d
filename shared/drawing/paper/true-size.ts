import { boundsOf, type Bounds, type Point, type Shape } from '../shape.ts';

/** How a line is drawn on paper: what is cut, what is seen, what is hidden, and what only helps. */
export type Pen = 'cut' | 'line' | 'hidden' | 'help';

export interface Stroke {
  points: Point[];
  closed: boolean;
  pen: Pen;
}

export interface Lettering {
  at: Point;
  text: string;
  /** height of the letters, mm */
  size: number;
  anchor: 'start' | 'middle' | 'end';
}

/** A drawing at its true size, mm: x to the right, y down, everything between 0 and its width and height. */
export interface TrueDrawing {
  title: string;
  width: number;
  height: number;
  strokes: Stroke[];
  letters: Lettering[];
}

/** Room left round what is drawn, mm. */
const ROUND = 4;

/** Lays strokes and letters on a paper of their own; they may lie anywhere before. */
export function onPaper(
  title: string,
  strokes: readonly Stroke[],
  letters: readonly Lettering[],
): TrueDrawing {
  const bounds = boundsOf([...strokes, { points: letters.flatMap(cornersOf) }]);
  const { min, max }: Bounds = bounds ?? { min: [0, 0], max: [0, 0] };
  const move = ([x, y]: Point): Point => [x - min[0] + ROUND, y - min[1] + ROUND];
  return {
    title,
    width: max[0] - min[0] + 2 * ROUND,
    height: max[1] - min[1] + 2 * ROUND,
    strokes: strokes.map((stroke) => ({ ...stroke, points: stroke.points.map(move) })),
    letters: letters.map((letter) => ({ ...letter, at: move(letter.at) })),
  };
}

/** A letter is about half as wide as it is high. */
const LETTER_WIDTH = 0.55;

/** The room that a text takes, roughly. */
function cornersOf({ at: [x, y], text, size, anchor }: Lettering): Point[] {
  const width = text.length * size * LETTER_WIDTH;
  const left = anchor === 'start' ? x : anchor === 'middle' ? x - width / 2 : x - width;
  return [
    [left, y - size],
    [left + width, y + size * 0.3],
  ];
}

/** Strokes and letters of a drawing moved by a place. */
export function moved({ strokes, letters }: Marks, [dx, dy]: Point): Marks {
  const move = ([x, y]: Point): Point => [x + dx, y + dy];
  return {
    strokes: strokes.map((stroke) => ({ ...stroke, points: stroke.points.map(move) })),
    letters: letters.map((letter) => ({ ...letter, at: move(letter.at) })),
  };
}
type Marks = Pick<TrueDrawing, 'strokes' | 'letters'>;

/** What is drawn on paper of a shape; cloth and dope are not. */
export function strokesOf(shape: Shape, place: (point: Point) => Point): Stroke[] {
  if (shape.kind === 'covering' || shape.kind === 'finish') return [];
  const pen = penOf(shape);
  const stroke = (points: Point[]): Stroke => ({ points: points.map(place), closed: shape.closed, pen });
  return shape.hole ? [stroke(shape.points), stroke(shape.hole)] : [stroke(shape.points)];
}

function penOf({ kind, hidden }: Shape): Pen {
  if (kind === 'outline') return 'cut';
  if (kind === 'joint') return 'help';
  return hidden ? 'hidden' : 'line';
}
