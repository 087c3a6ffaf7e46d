import { describe, expect, it } from 'vitest';
import { noticeWords } from '#client/components/notice-text.ts';
import type { Notice } from '#shared/core/notices.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('dunlin');
const path = 'wing/spar-top';
const ALL: Notice[] = [
  { code: 'no_wing', path: 'plan' },
  { code: 'no_mass', path: 'plan' },
  { code: 'no_tailplane', path: 'plan' },
  { code: 'part_measures_nothing', path },
  { code: 'station_past_tip', path, station: 600, tip: 585 },
  { code: 'reversed_range', path, from: 50, to: 10 },
  { code: 'strip_outside_section', path, station: 585, overBy: 0.4 },
  { code: 'strip_outside_chord', path, station: 585, overBy: 2 },
  { code: 'strips_overlap', path, other: 'stringer-top-aft', station: 0, overBy: 1.5 },
  { code: 'tube_wall_too_thick', path },
  { code: 'rib_notched_through', path: 'wing/ribs-inner', station: 100 },
  { code: 'skin_past_trailing_edge', path, end: 1.1 },
  { code: 'skin_thicker_than_section', path, station: 0 },
  { code: 'web_without_height', path, station: 10 },
  { code: 'no_ribs_for_caps', path },
  { code: 'share_of_no_wood', path },
  { code: 'section_self_crossing', path: 'wing', panel: 1, end: 'tip', at: 0.4 },
  { code: 'chord_step', path: 'wing', panel: 1, by: -5 },
  { code: 'outline_without_area', path: 'solid/pod' },
  { code: 'balance_outside_target', path: 'plan', byMm: -3.2, byPercentMac: -2.6 },
  { code: 'balance_aft_of_neutral_point', path: 'plan', byMm: 4 },
  { code: 'reynolds_low', path: 'plan', reynolds: 15_000, clMax: 1.1 },
];

describe('notices in words', () => {
  it.each(ALL)('$code is a whole sentence without a code, a path or an unfilled place', (notice) => {
    const { text } = noticeWords(notice, plan, USUAL_UNITS);
    expect(text).toMatch(/^[A-Z“].*\.$/);
    expect(text).not.toMatch(/_|undefined|NaN|wing\//);
  });

  it('names the part with its surface, the station and by how much', () => {
    const { text, line, tone } = noticeWords(
      { code: 'strip_outside_section', path, station: 585, overBy: 0.4 },
      plan,
      USUAL_UNITS,
    );
    expect(text).toBe(
      'Spar, top (wing) is 0.40\u202fmm too high for the section at 585.0\u202fmm from the root.',
    );
    expect({ line, tone }).toEqual({ line: path, tone: 'red' });
  });

  it('says “at the root” of station 0 and names the other strip', () => {
    const { text } = noticeWords(
      { code: 'strips_overlap', path, other: 'stringer-top-aft', station: 0, overBy: 1.5 },
      plan,
      USUAL_UNITS,
    );
    expect(text).toBe('Spar, top (wing) and Stringer, top aft share 1.5\u202fmm of room at the root.');
  });

  it('says on which side of the wanted point the balance lies', () => {
    const side = (byMm: number) =>
      noticeWords(
        { code: 'balance_outside_target', path: 'plan', byMm, byPercentMac: byMm },
        plan,
        USUAL_UNITS,
      );
    expect(side(-3).text).toContain('ahead of the wanted one');
    expect(side(3).text).toContain('behind the wanted one');
    expect(side(3).line).toBeNull();
  });

  it('picks a solid by its line and tells a part that is gone by its path', () => {
    expect(noticeWords({ code: 'outline_without_area', path: 'solid/pod' }, plan, USUAL_UNITS).line).toBe(
      'solid/pod',
    );
    const gone = noticeWords({ code: 'part_measures_nothing', path: 'wing/gone' }, plan, USUAL_UNITS);
    expect(gone).toMatchObject({ line: null });
    expect(gone.text).toContain('“wing/gone”');
  });
});
