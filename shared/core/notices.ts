/**
 * What the core says instead of NaN, Infinity or a silent 0. A notice is a code with data; the client words it.
 * `path` points into the plan, in the form of a line's id (`wing/spar-top`), a surface's key, or `plan`.
 */
export type Notice =
  | { code: 'no_wing'; path: 'plan' }
  | { code: 'no_mass'; path: 'plan' }
  | { code: 'no_tailplane'; path: 'plan' }
  | { code: 'part_measures_nothing'; path: string }
  | { code: 'station_past_tip'; path: string; station: number; tip: number }
  | { code: 'reversed_range'; path: string; from: number; to: number }
  | { code: 'strip_outside_section'; path: string; station: number; overBy: number }
  | { code: 'strip_outside_chord'; path: string; station: number; overBy: number }
  | { code: 'strips_overlap'; path: string; other: string; station: number; overBy: number }
  | { code: 'tube_wall_too_thick'; path: string }
  | { code: 'rib_notched_through'; path: string; station: number }
  | { code: 'skin_past_trailing_edge'; path: string; end: number }
  | { code: 'skin_thicker_than_section'; path: string; station: number }
  | { code: 'web_without_height'; path: string; station: number }
  | { code: 'no_ribs_for_caps'; path: string }
  | { code: 'share_of_no_wood'; path: string }
  | { code: 'section_self_crossing'; path: string; panel: number; end: 'root' | 'tip'; at: number }
  | { code: 'chord_step'; path: string; panel: number; by: number }
  | { code: 'outline_without_area'; path: string }
  | { code: 'balance_outside_target'; path: 'plan'; byMm: number; byPercentMac: number }
  | { code: 'balance_aft_of_neutral_point'; path: 'plan'; byMm: number }
  | { code: 'reynolds_low'; path: 'plan'; reynolds: number; clMax: number };

/** What a notice tells; stable, for whoever words it. */
export type NoticeCode = Notice['code'];

/**
 * Gathers notices in the order in which they are told, each code once for a path.
 * @example (board = noticeBoard(), board.tell({ code: 'no_wing', path: 'plan' }), board.notices.length) // → 1
 */
export function noticeBoard(): { notices: Notice[]; tell: (notice: Notice) => void } {
  const notices: Notice[] = [];
  const told = new Set<string>();
  const tell = (notice: Notice) => {
    const key = `${notice.code} ${notice.path}`;
    if (told.has(key)) return;
    told.add(key);
    notices.push(notice);
  };
  return { notices, tell };
}
