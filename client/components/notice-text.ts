import type { Notice } from '#shared/core/notices.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** A notice in words: red where something lies outside its limits or cannot be built so, plain where it is a hint. */
export interface NoticeWords {
  tone: 'red' | 'plain';
  text: string;
  /** line of the balance sheet to pick for it; null where it is about a surface or the whole plan */
  line: string | null;
}

/** What the calculator has to say of a plan, each code in one or two plain sentences. */
export function noticeWords(notice: Notice, plan: Plan, units: Units): NoticeWords {
  const mm = (value: number) => units.format(value, 'length', { fine: Math.abs(value) < 1 });
  const at = (station: number) => (station < 0.05 ? 'at the root' : `at ${mm(station)} from the root`);
  const line = lineNamed(plan, notice.path);
  const name = line ?? `“${notice.path}”`;
  const words = (tone: NoticeWords['tone'], text: string): NoticeWords => ({
    tone,
    text,
    line: line === null ? null : notice.path,
  });
  switch (notice.code) {
    case 'no_wing':
      return words('plain', 'The plan has no wing yet: balance in % MAC and wing loading need one.');
    case 'no_mass':
      return words('plain', 'Nothing has a mass yet. Add parts or items.');
    case 'no_tailplane':
      return words('plain', 'Without a tailplane there is no neutral point and no static margin.');
    case 'part_measures_nothing':
      return words('plain', `${name} weighs nothing as it is drawn. Look at its range and sizes.`);
    case 'station_past_tip':
      return words(
        'red',
        `${name} reaches ${mm(notice.station)} from the root; the surface ends at ${mm(notice.tip)}. What lies beyond is not counted.`,
      );
    case 'reversed_range':
      return words(
        'plain',
        `${name} runs from ${mm(notice.from)} to ${mm(notice.to)}, from the tip inward. It is read the other way round.`,
      );
    case 'strip_outside_section':
      return words('red', `${name} is ${mm(notice.overBy)} too high for the section ${at(notice.station)}.`);
    case 'strip_outside_chord':
      return words('red', `${name} lies ${mm(notice.overBy)} outside the chord ${at(notice.station)}.`);
    case 'strips_overlap':
      return words(
        'red',
        `${name} and ${partName(plan, notice.path, notice.other)} share ${mm(notice.overBy)} of room ${at(notice.station)}.`,
      );
    case 'tube_wall_too_thick':
      return words('red', `The wall of ${name} is thicker than the tube allows; it is counted as solid.`);
    case 'rib_notched_through':
      return words('red', `${name}: notches and sheeting leave nothing of the rib ${at(notice.station)}.`);
    case 'skin_past_trailing_edge':
      return words(
        'red',
        `${name} would reach ${units.format(notice.end, 'share')} of the chord, past the trailing edge.`,
      );
    case 'skin_thicker_than_section':
      return words('red', `${name} is thicker than the section has room for ${at(notice.station)}.`);
    case 'web_without_height':
      return words('red', `${name} is left no height by spars and sheeting ${at(notice.station)}.`);
    case 'no_ribs_for_caps':
      return words('plain', `${name}: there are no ribs in that range to carry them.`);
    case 'share_of_no_wood':
      return words('plain', `${name} is a share of the wood, and the surface has no wood yet.`);
    case 'section_self_crossing':
      return words(
        'red',
        `The ${notice.end} section of panel ${notice.panel + 1} of ${surfaceName(notice.path)} crosses itself at ${units.format(notice.at, 'share')} of the chord.`,
      );
    case 'chord_step':
      return words(
        'plain',
        `Panel ${notice.panel + 1} of ${surfaceName(notice.path)} begins ${mm(Math.abs(notice.by))} ${notice.by > 0 ? 'wider' : 'narrower'} than the one before it ends.`,
      );
    case 'outline_without_area':
      return words('red', `The outline of ${name} encloses no area.`);
    case 'balance_outside_target':
      return words(
        'red',
        `The balance point lies ${mm(Math.abs(notice.byMm))} ${notice.byMm > 0 ? 'behind' : 'ahead of'} the wanted one (${formatNumber(Math.abs(notice.byPercentMac), 1)} % MAC).`,
      );
    case 'balance_aft_of_neutral_point':
      return words(
        'red',
        `The balance point lies ${mm(notice.byMm)} behind the neutral point: the model would not right itself.`,
      );
    case 'reynolds_low':
      return words(
        'plain',
        `At stall speed the Reynolds number is about ${units.format(notice.reynolds, 'reynolds')}: a lift coefficient of ${formatNumber(notice.clMax, 2)} is then more than light sections usually give.`,
      );
  }
}

/** Names as they stand in the plan; a part is told with its surface where the plan has several. */
function lineNamed(plan: Plan, path: string): string | null {
  for (const surface of plan.surfaces) {
    const part = surface.parts.find(({ id }) => `${surface.key}/${id}` === path);
    if (part) return plan.surfaces.length > 1 ? `${part.name} (${surface.key})` : part.name;
  }
  const solid = plan.solids.find(({ id }) => `solid/${id}` === path);
  return solid?.name ?? plan.items.find(({ id }) => `item/${id}` === path)?.name ?? null;
}

function partName(plan: Plan, path: string, id: string): string {
  const surface = plan.surfaces.find(({ key, parts }) => parts.some((part) => `${key}/${part.id}` === path));
  return surface?.parts.find((part) => part.id === id)?.name ?? `“${id}”`;
}

const surfaceName = (key: string) => `the ${key}`;
