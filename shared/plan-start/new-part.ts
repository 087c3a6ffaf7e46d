import { halfOf } from '#shared/core/half.ts';
import type { Pair, Part, Strip, Surface } from '#shared/core/plan.ts';
import { heightAt } from '#shared/core/section-integrals.ts';
import { stationAt, surfaceLine } from '#shared/core/stations.ts';

/** What can be added to a surface, in the order in which a wing is built. */
export type PartChoice =
  | 'ribs'
  | 'spar'
  | 'stringer'
  | 'leadingEdge'
  | 'trailingEdge'
  | 'sheeting'
  | 'capStrips'
  | 'web'
  | 'tipBlock'
  | 'sheet'
  | 'covering'
  | 'finish'
  | 'glue';

type Bare<P> = P extends Part ? Omit<P, 'id' | 'material'> : never;
/** A part without the id and the material that its plan gives it. */
export type NewPart = Bare<Part>;

/** Sizes to tenths of a mm, as stock is sold. */
const tenths = (value: number) => Math.max(0.1, Math.round(value * 10) / 10);
const RIB_SPACING_CHORDS = 0.4;
/** Most that a part takes of the section's depth where it lies; common practice, no source. */
const DEPTH = { spar: 0.2, stringer: 0.25, sheeting: 0.08 } as const;

/** A part of that sort in sizes that suit the surface, to be altered from there. */
export function newPart(choice: PartChoice, surface: Surface): NewPart {
  const line = surfaceLine(surface);
  const span = line.length;
  const root = surface.panels[0]?.rootChord ?? 100;
  const tip = surface.panels.at(-1)?.tipChord ?? root;
  const half = halfOf(surface, line, 'starboard', () => undefined);
  const range = { from: 0, to: span };
  const spars = half.strips.filter(isSpar);
  const sparAt = spars[0]?.at?.[0] ?? 0.3;
  const depthAt = (s: number, x: number) => {
    const { section, chord } = stationAt(line, s);
    return heightAt(section, x) * chord;
  };
  /** A size that is usual at the root and at the tip, or as much less as a thin section asks for. */
  const within = (atRoot: number, atTip: number, share: number, x: number): Pair => [
    Math.min(atRoot, tenths(share * depthAt(0, x))),
    Math.min(atTip, tenths(share * depthAt(span, x))),
  ];
  const strip = (
    name: string,
    group: string,
    own: Partial<Strip> & Pick<Strip, 'seat' | 'width' | 'height'>,
  ): NewPart => ({
    ...range,
    kind: 'strip',
    name,
    group,
    profile: 'rectangle',
    ...own,
  });
  switch (choice) {
    case 'ribs': {
      const count = Math.max(2, Math.round(span / (RIB_SPACING_CHORDS * root)) + 1);
      return { ...range, kind: 'ribs', name: 'Ribs', group: 'ribs', count, thickness: 1.5, lightening: 0 };
    }
    case 'spar': {
      const seat = spars.some((spar) => spar.seat === 'top') ? 'bottom' : 'top';
      const width: [number, number] = [tenths(root * 0.035), tenths(tip * 0.035)];
      return strip(`Spar, ${seat}`, 'spars', {
        seat,
        width,
        height: within(3, 2, DEPTH.spar, sparAt),
        at: [sparAt, sparAt],
        letIn: true,
      });
    }
    case 'stringer': {
      const own = {
        width: [1.6, 1.6],
        height: within(1.6, 1.6, DEPTH.stringer, 0.6),
        at: [0.6, 0.6],
      } satisfies Partial<Strip>;
      return strip('Stringer, top', 'stringers', { ...own, seat: 'top', letIn: true });
    }
    case 'leadingEdge': {
      const size: [number, number] = [tenths(root * 0.035), tenths(tip * 0.035)];
      return strip('Leading edge', 'edges', { seat: 'nose', width: size, height: size });
    }
    case 'trailingEdge': {
      const width: [number, number] = [tenths(root * 0.12), tenths(tip * 0.12)];
      const height: [number, number] = [tenths(root * 0.025), tenths(tip * 0.025)];
      return strip('Trailing edge', 'edges', { seat: 'tail', width, height, profile: 'triangle' });
    }
    case 'sheeting': {
      const thickness = Math.min(...within(1, 1, DEPTH.sheeting, sparAt));
      const own = { start: sparAt, end: sparAt, seat: 'wrap', thickness } as const;
      return { ...range, kind: 'skin', name: 'Nose sheeting', group: 'sheeting', ...own };
    }
    case 'capStrips': {
      const skinEnd = Math.max(0, ...half.skins.map((skin) => Math.max(skin.start, skin.end)));
      const tail = half.strips.find((s) => s.seat === 'tail');
      const end = Math.round(100 * (1 - (tail ? tail.width[0] / root : 0.1))) / 100;
      const own = { start: Math.min(skinEnd, 0.8), end: Math.max(end, 0.82), seat: 'both' } as const;
      return {
        ...range,
        kind: 'capStrips',
        name: 'Cap strips',
        group: 'sheeting',
        ...own,
        width: 5,
        thickness: 1,
      };
    }
    case 'web':
      return {
        ...range,
        to: Math.round(span / 2),
        kind: 'web',
        name: 'Shear web',
        group: 'webs',
        at: [sparAt, sparAt],
        thickness: 1.5,
      };
    case 'tipBlock':
      return {
        kind: 'tipBlock',
        name: 'Tip block',
        group: 'tips',
        length: Math.max(5, Math.round(tip * 0.25)),
        hollow: 0,
      };
    case 'sheet':
      return { kind: 'sheet', name: 'Sheet', thickness: 3, cutout: 0 };
    case 'covering':
      return { ...range, kind: 'covering', name: 'Covering', group: 'covering', seat: 'both', overlap: 0.05 };
    case 'finish':
      return { ...range, kind: 'finish', name: 'Finish', group: 'covering', seat: 'both', overlap: 0 };
    case 'glue':
      return { kind: 'glue', name: 'Glue', group: 'glue', method: 'joints', layers: 1 };
  }
}

const isSpar = (strip: Strip) =>
  (strip.seat === 'top' || strip.seat === 'bottom') && (strip.group === 'spars' || /spar/i.test(strip.name));
