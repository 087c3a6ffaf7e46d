import { cosDegrees, radians, type Vec3 } from './frame.ts';
import type { Pair, Panel, Surface } from './plan.ts';
import { blendSections, readPair, type Section } from './section.ts';

/** One panel of a surface as its stations see it, mm. Everything is linear in s inside a panel. */
export interface PanelLine {
  /** from 0 at the root */
  index: number;
  /** first and last station */
  start: number;
  end: number;
  /** at root and tip */
  chord: Pair;
  /** x at root and tip */
  leadingEdge: Pair;
  /** of the root's leading edge */
  y: number;
  z: number;
  /** of the dihedral */
  cos: number;
  sin: number;
  /** the section at either end as it is at a chord */
  root: (chord: number) => Section;
  tip: (chord: number) => Section;
  /** the blended section at a share of the span; parts ask for the same stations, so each is made once */
  sectionAt: (share: number) => Section;
  /** stations already laid out, by s */
  known: Map<number, Station>;
}

/** A surface laid out along its stations, starboard half, in body axes. */
export interface SurfaceLine {
  /** of all panels, mm; a tip block lies beyond */
  length: number;
  panels: PanelLine[];
}

/** Where a station lies and how big the surface is there. Changes along s are per mm of s. */
export interface Station {
  s: number;
  panel: PanelLine;
  chord: number;
  chordSlope: number;
  /** x of the leading edge */
  leadingEdge: number;
  leadingEdgeSlope: number;
  /** made when first asked for: much is asked of a station that needs no section */
  readonly section: Section;
}

/** A station that looks its section up only when that is asked for. */
class PanelStation implements Station {
  constructor(
    readonly s: number,
    readonly panel: PanelLine,
    private readonly share: number,
    readonly chord: number,
    readonly chordSlope: number,
    readonly leadingEdge: number,
    readonly leadingEdgeSlope: number,
  ) {}

  get section(): Section {
    return this.panel.sectionAt(this.share);
  }
}

function blender(panel: Panel): Pick<PanelLine, 'root' | 'tip' | 'sectionAt'> {
  const { root, tip } = readPair(panel.rootSection, panel.tipSection);
  const made = new Map<number, Section>();
  const sectionAt = (share: number) => {
    const known = made.get(share);
    if (known) return known;
    const chord = panel.rootChord + share * (panel.tipChord - panel.rootChord);
    const section = root === tip ? root(chord) : blendSections(root(chord), tip(chord), share);
    made.set(share, section);
    return section;
  };
  return { root, tip, sectionAt };
}

/**
 * Lays a surface out along its stations, starboard half, from its apex outward.
 * @example surfaceLine(EXAMPLE_WING).length // → 500
 */
export function surfaceLine(surface: Surface): SurfaceLine {
  let [x, y, z] = surface.apex;
  let start = 0;
  const panels = surface.panels.map((panel, index): PanelLine => {
    const cos = cosDegrees(panel.dihedral);
    const sin = Math.sin(radians(panel.dihedral));
    const line: PanelLine = {
      index,
      start,
      end: start + panel.span,
      chord: [panel.rootChord, panel.tipChord],
      leadingEdge: [x, x + panel.sweep],
      y,
      z,
      cos,
      sin,
      ...blender(panel),
      known: new Map(),
    };
    start += panel.span;
    x += panel.sweep;
    y += panel.span * cos;
    z += panel.span * sin;
    return line;
  });
  return { length: start, panels };
}

/** Stations closer than this, mm, are one. */
const EDGE = 1e-9;

/**
 * Panel that holds station s, mm; a station on a break belongs to the panel inboard of it, one past the tip to the
 * last panel.
 * @throws RangeError when the surface has no panel
 * @example panelAt(EXAMPLE_LINE, 100).end // → 500
 */
export function panelAt(line: SurfaceLine, s: number): PanelLine {
  const found = line.panels.find((panel) => s <= panel.end + EDGE) ?? line.panels.at(-1);
  if (!found) throw new RangeError('a surface has at least one panel');
  return found;
}

/**
 * The station at s, mm from the root along the panels; inside `panel` if that is given. Past the tip the chord is
 * that of the tip.
 * @throws RangeError when the surface has no panel
 * @example stationAt(EXAMPLE_LINE, 100).chord // → 100
 */
export function stationAt(line: SurfaceLine, s: number, panel: PanelLine = panelAt(line, s)): Station {
  const known = panel.known.get(s);
  if (known) return known;
  const span = panel.end - panel.start;
  const share = Math.min(1, Math.max(0, (s - panel.start) / span));
  const [c0, c1] = panel.chord;
  const [x0, x1] = panel.leadingEdge;
  const chord = c0 + share * (c1 - c0);
  const station = new PanelStation(
    s,
    panel,
    share,
    chord,
    (c1 - c0) / span,
    x0 + share * (x1 - x0),
    (x1 - x0) / span,
  );
  panel.known.set(s, station);
  return station;
}

/**
 * Body coordinates of a point of the station's section: `x` mm behind the leading edge and `z` mm above the chord
 * line, square to the panel. A panel with dihedral leans its section inboard.
 * @example pointOf(EXAMPLE_STATION, 25, 5) // → [25, 100, 5]
 */
export function pointOf(station: Station, x: number, z: number): Vec3 {
  const { panel, s } = station;
  const along = s - panel.start;
  return [
    station.leadingEdge + x,
    panel.y + along * panel.cos - z * panel.sin,
    panel.z + along * panel.sin + z * panel.cos,
  ];
}

/**
 * Value at s of a pair that holds at `from` and at `to`, stations in mm; the first value where the range has no
 * length.
 * @example pairAt([2, 4], 0, 100, 50) // → 3
 */
export function pairAt(pair: Pair, from: number, to: number, s: number): number {
  return to - from > EDGE ? pair[0] + ((pair[1] - pair[0]) * (s - from)) / (to - from) : pair[0];
}

/**
 * Change per mm of s of such a pair; 0 where its range has no length.
 * @example pairSlope([2, 4], 0, 100) // → 0.02
 */
export function pairSlope(pair: Pair, from: number, to: number): number {
  return to - from > EDGE ? (pair[1] - pair[0]) / (to - from) : 0;
}

/** Gauss–Legendre nodes and weights on (0, 1), five points: exact for polynomials up to the ninth degree. */
const GAUSS: readonly [node: number, weight: number][] = [
  [0.04691007703066802, 0.11846344252809454],
  [0.23076534494715845, 0.23931433524968324],
  [0.5, 0.28444444444444444],
  [0.7692346550528415, 0.23931433524968324],
  [0.9530899229693319, 0.11846344252809454],
];

/** One place at which an integral along the surface is sampled. */
export interface Sample {
  station: Station;
  /** mm of s that the sample stands for */
  ds: number;
}

/**
 * Samples for integrals over [from, to], mm, split at panel breaks and at the further `breaks`, so that each piece
 * is smooth: ∫f ds = Σ f(station)·ds, exact for a polynomial up to the ninth degree in each piece. The range is
 * clipped to the surface; breaks may come in any order, those outside are passed over.
 * @example samplesOver(EXAMPLE_LINE, 0, 500, [200]).reduce((sum, { ds }) => sum + ds, 0) // → 500
 */
export function samplesOver(
  line: SurfaceLine,
  from: number,
  to: number,
  breaks: readonly number[] = [],
): Sample[] {
  const samples: Sample[] = [];
  for (const panel of line.panels) {
    const a = Math.max(from, panel.start);
    const b = Math.min(to, panel.end);
    if (b - a <= EDGE) continue;
    const edges = [...breaks.filter((s) => s > a + EDGE && s < b - EDGE).sort((p, q) => p - q), b];
    let low = a;
    for (const edge of edges) {
      const width = edge - low;
      if (width <= EDGE) continue;
      for (const [node, weight] of GAUSS) {
        samples.push({ station: stationAt(line, low + node * width, panel), ds: weight * width });
      }
      low = edge;
    }
  }
  return samples;
}
