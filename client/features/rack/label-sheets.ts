export interface LabelSheet {
  name: string;
  /** labels on one page */
  count: number;
  /** how the page is divided, in the style sheet */
  className: string;
}

/** A4 cut into equal labels without a margin, and one label to a page of its own. */
export const LABEL_SHEETS: readonly [LabelSheet, ...LabelSheet[]] = [
  { name: 'A4, 3 × 8 labels of 70 × 37 mm', count: 24, className: 'label-page-24' },
  { name: 'A4, 2 × 7 labels of 105 × 42 mm', count: 14, className: 'label-page-14' },
  { name: 'Single labels of 70 × 37 mm', count: 1, className: 'label-page-1' },
];

/** What stands on which page. */
export function pagesOf<T>(labels: readonly T[], { count }: Pick<LabelSheet, 'count'>): T[][] {
  return Array.from({ length: Math.ceil(labels.length / count) }, (_, page) =>
    labels.slice(page * count, (page + 1) * count),
  );
}

/** More would make an address that not every server takes. */
export const LABELS_AT_ONCE = 96;

/** On the button that leads to the labels of what was chosen, or else of all that is shown. */
export function labelsText(chosen: number, wanted: number): string {
  if (wanted > LABELS_AT_ONCE) return `Labels of the first ${LABELS_AT_ONCE}`;
  return chosen > 0 ? `Labels of ${chosen}` : 'Labels';
}
