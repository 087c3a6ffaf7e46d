/** Longer than a closing menu takes to give the focus back to its button, ms. */
const AFTER_MENUS = 40;

/** The row itself, the first field of its form, or the arrow that moved it. */
type Place = 'row' | 'form' | 'up' | 'down';
const SELECTORS: Record<Place, string> = {
  row: '[data-row]',
  form: '[data-form] input',
  up: '[data-move="up"]',
  down: '[data-move="down"]',
};

/** A wish to move the focus to a row that is only about to appear. */
export class FocusWish {
  private wanted: { line: string | null; where: Place; late: boolean } | null = null;

  /** A place in the row of a line; null: whatever follows the list. Late where a menu is only closing. */
  ask(line: string | null, where: Place, late = where === 'form'): void {
    this.wanted = { line, where, late };
  }

  /** Whether a wish is still to be granted. */
  asked(): boolean {
    return this.wanted !== null;
  }

  /** Grants the wish if the list has the row by now. */
  grant(list: HTMLElement | null): void {
    const { wanted } = this;
    if (!list || !wanted) return;
    const target = wanted.line === null ? afterList(list) : within(list, wanted.line, wanted.where);
    if (!target) return;
    this.wanted = null;
    setTimeout(() => target.focus(), wanted.late ? AFTER_MENUS : 0);
  }
}

function within(list: HTMLElement, line: string, where: Place): HTMLElement | null {
  const row = list.querySelector<HTMLElement>(`[data-line="${CSS.escape(line)}"]`);
  return row?.querySelector<HTMLElement>(SELECTORS[where]) ?? null;
}

function afterList(list: HTMLElement): HTMLElement | null {
  return list.parentElement?.querySelector<HTMLElement>('ul ~ div button') ?? null;
}
