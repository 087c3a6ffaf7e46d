import type { ImportPreviewDto } from '#shared/schemas/rack.ts';

/** `12 pieces can be taken in; 2 lines cannot; 1 should be looked at.` */
export function previewHeadline({ rows, bad }: Pick<ImportPreviewDto, 'rows' | 'bad'>): string {
  const doubts = rows.filter(({ doubt }) => doubt !== null).length;
  const good =
    rows.length === 0
      ? 'No line can be taken in'
      : `${rows.length} ${rows.length === 1 ? 'piece' : 'pieces'} can be taken in`;
  return `${[
    good,
    ...(bad.length > 0 ? [`${bad.length} ${bad.length === 1 ? 'line' : 'lines'} cannot`] : []),
    ...(doubts > 0 ? [`${doubts} should be looked at`] : []),
  ].join('; ')}.`;
}

/** `“len (in)” → length, in`, and `“Shop” is left out` for a column that is not looked at. */
export function columnText({ header, field, unit }: ImportPreviewDto['columns'][number]): string {
  if (field === null) return `“${header}” is left out`;
  const name = field.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
  return `“${header}” → ${name}${unit === null ? '' : `, ${unit}`}`;
}
