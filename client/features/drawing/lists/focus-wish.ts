/** Longer than a closing menu takes to give the focus back to its button, ms. */
const AFTER_MENUS = 40;

/** A wish to move the focus to a row that is only about to appear. */
export class FocusWish {
  private wanted: { line: string | null; where: 'row' | 'form' } | null = null;

  /** The row itself, or the first field of its form; null: whatever follows the list. */
  ask(line: string | null, where: 'row' | 'form'): void {
    this.wanted = { line, where };
  }

  /** Grants the wish if the list has the row by now. */
  grant(list: HTMLElement | null): void {
    const { wanted } = this;
    if (!list || !wanted) return;
    const target = wanted.line === null ? afterList(list) : within(list, wanted.line, wanted.where);
    if (!target) return;
    this.wanted = null;
    setTimeout(() => target.focus(), wanted.where === 'form' ? AFTER_MENUS : 0);
  }
}

function within(list: HTMLElement, line: string, where: 'row' | 'form'): HTMLElement | null {
  const row = list.querySelector<HTMLElement>(`[data-line="${CSS.escape(line)}"]`);
  return row?.querySelector<HTMLElement>(where === 'row' ? '[data-row]' : '[data-form] input') ?? null;
}

function afterList(list: HTMLElement): HTMLElement | null {
  return list.parentElement?.querySelector<HTMLElement>('ul ~ div button') ?? null;
}
