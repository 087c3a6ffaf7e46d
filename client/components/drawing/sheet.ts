import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Bounds, Point } from '#shared/drawing/shape.ts';

/** How a drawing in mm lies on the screen: px per mm, where its origin is, and which way its axes run. */
export interface Sheet {
  scale: number;
  originX: number;
  originY: number;
  /** plan: x aft runs down and y to the right; elevation: x aft runs to the right and z up */
  axes: 'plan' | 'elevation';
}

export interface Margins {
  top: number;
  right: number;
  bottom: number;
  left: number;
}

/** What the reader has done to the view: 1 fits the paper. Pan in px. */
export interface Zoom {
  factor: number;
  panX: number;
  panY: number;
}
export const FITTED: Zoom = { factor: 1, panX: 0, panY: 0 };
export const ZOOM_STEP = 1.4;
const ZOOM_LIMITS = { min: 1, max: 24 } as const;

/** CSS px of one mm on paper: a CSS inch has 96 px (CSS Values and Units, 5.2) and 25.4 mm. */
const PX_PER_MM = 96 / 25.4;

export function toPx({ scale, originX, originY, axes }: Sheet, [a, b]: Point): Point {
  return axes === 'plan'
    ? [originX + b * scale, originY + a * scale]
    : [originX + a * scale, originY - b * scale];
}

export function fromPx({ scale, originX, originY, axes }: Sheet, [px, py]: Point): Point {
  return axes === 'plan'
    ? [(py - originY) / scale, (px - originX) / scale]
    : [(px - originX) / scale, (originY - py) / scale];
}

interface Paper {
  axes: Sheet['axes'];
  width: number;
  margins: Margins;
  maxHeight: number;
  minHeight: number;
  /** px per mm that is never exceeded when fitted, so that a small tail is not blown up */
  maxScale?: number;
  /** zoom beyond fitting */
  factor?: number;
}

/** A drawing on its paper: how it lies, how large the paper is and where its middle is, px. */
export interface Laid {
  sheet: Sheet;
  width: number;
  height: number;
  middle: Point;
}

/** Lays bounds on paper of a given width, as large as fits, centred; zoomed about the middle of the paper. */
export function layOnPaper(bounds: Bounds, paper: Paper): Laid {
  const { axes, width, margins, maxHeight, minHeight, maxScale = Infinity, factor = 1 } = paper;
  const size = [bounds.max[0] - bounds.min[0], bounds.max[1] - bounds.min[1]] as const;
  const [across, down] = axes === 'plan' ? [size[1], size[0]] : [size[0], size[1]];
  const room = Math.max(40, width - margins.left - margins.right);
  const tall = Math.max(30, maxHeight - margins.top - margins.bottom);
  const fit = Math.min(room / Math.max(across, 1e-6), tall / Math.max(down, 1e-6), maxScale);
  const height = Math.max(minHeight, Math.ceil(down * fit + margins.top + margins.bottom));
  const scale = fit * factor;
  const middle: Point = [margins.left + room / 2, margins.top + (height - margins.top - margins.bottom) / 2];
  const centre: Point = [(bounds.min[0] + bounds.max[0]) / 2, (bounds.min[1] + bounds.max[1]) / 2];
  const away = toPx({ scale, originX: 0, originY: 0, axes }, centre);
  return {
    sheet: { scale, originX: middle[0] - away[0], originY: middle[1] - away[1], axes },
    width,
    height,
    middle,
  };
}

/** The view larger or smaller, with the place `at` (px) staying where it is; `middle` is that of the paper. */
export function zoomedAt(zoom: Zoom, by: number, at: Point, middle: Point): Zoom {
  const factor = Math.min(ZOOM_LIMITS.max, Math.max(ZOOM_LIMITS.min, zoom.factor * by));
  if (factor < 1.01) return FITTED;
  const grown = factor / zoom.factor;
  const pan = (place: number, centre: number, before: number) =>
    place - centre - (place - centre - before) * grown;
  return { factor, panX: pan(at[0], middle[0], zoom.panX), panY: pan(at[1], middle[1], zoom.panY) };
}

/** The least of a drawing that stays in sight however it is pushed, px. */
const IN_SIGHT = 60;

/** The view pushed aside, but never out of sight; `paper` is that of the present view. */
export function panned(zoom: Zoom, dx: number, dy: number, bounds: Bounds, paper: Laid): Zoom {
  const [a, b] = [toPx(paper.sheet, bounds.min), toPx(paper.sheet, bounds.max)];
  const within = (value: number, low: number, high: number) => Math.max(low, Math.min(high, value));
  return {
    factor: zoom.factor,
    panX: within(
      zoom.panX + dx,
      IN_SIGHT - Math.max(a[0], b[0]),
      paper.width - IN_SIGHT - Math.min(a[0], b[0]),
    ),
    panY: within(
      zoom.panY + dy,
      IN_SIGHT - Math.max(a[1], b[1]),
      paper.height - IN_SIGHT - Math.min(a[1], b[1]),
    ),
  };
}

/** `1 : 3.2` or `2.5 : 1`, true on a screen with CSS px of their nominal size. */
export function scaleNote({ scale }: Pick<Sheet, 'scale'>): string {
  const ratio = PX_PER_MM / scale;
  const figure = (value: number) => formatNumber(value, value < 9.95 ? 1 : 0);
  return ratio >= 1
    ? `1${NARROW_SPACE}:${NARROW_SPACE}${figure(ratio)}`
    : `${figure(1 / ratio)}${NARROW_SPACE}:${NARROW_SPACE}1`;
}

/** A line in px as an SVG path, to tenths of a px. */
export function pathOf(sheet: Sheet, points: readonly Point[], closed: boolean): string {
  let path = '';
  for (const point of points) {
    const [x, y] = toPx(sheet, point);
    path += `${path === '' ? 'M' : 'L'}${Math.round(x * 10) / 10} ${Math.round(y * 10) / 10}`;
  }
  return closed ? `${path}Z` : path;
}
