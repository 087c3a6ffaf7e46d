import type { Point } from '../shape.ts';
import type { Lettering, Pen, Stroke, TrueDrawing } from './true-size.ts';

/** Widths of lines on paper, mm (ISO 128 knows 0.35 and 0.18), and the dashes of what is hidden. */
export const PENS: Record<Pen, { width: number; dashes?: string }> = {
  cut: { width: 0.35 },
  line: { width: 0.18 },
  hidden: { width: 0.18, dashes: '2 1' },
  help: { width: 0.13, dashes: '6 1 1 1' },
};

/** Hundredths of a millimetre are finer than any printer. */
const figure = (value: number) => String(Math.round(value * 100) / 100);

/** A line as an SVG path, mm. */
export function strokePath({ points, closed }: Pick<Stroke, 'points' | 'closed'>): string {
  const steps = points.map(([x, y]: Point, i) => `${i === 0 ? 'M' : 'L'}${figure(x)} ${figure(y)}`);
  return steps.join('') + (closed ? 'Z' : '');
}

const ESCAPES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

/** What XML may hold at all, escaped or not (XML 1.0, production 2, Char). */
function isAllowed(character: string): boolean {
  const code = character.codePointAt(0) ?? 0;
  if (code < 0x20) return code === 0x9 || code === 0xa || code === 0xd;
  return code <= 0xd7ff || (code >= 0xe000 && code <= 0xfffd) || code >= 0x10000;
}

function escaped(text: string): string {
  const allowed = [...text].filter(isAllowed).join('');
  return allowed.replace(/[&<>"']/g, (character) => ESCAPES[character] ?? character);
}

function letterText({ at: [x, y], text, size, anchor }: Lettering): string {
  return `<text x="${figure(x)}" y="${figure(y)}" font-size="${size}" text-anchor="${anchor}">${escaped(text)}</text>`;
}

/** A drawing as an SVG file at its true size: one unit is a millimetre. */
export function svgFile(drawing: TrueDrawing): string {
  const [width, height] = [figure(drawing.width), figure(drawing.height)];
  const groups = (Object.keys(PENS) as Pen[]).flatMap((pen) => {
    const strokes = drawing.strokes.filter((stroke) => stroke.pen === pen);
    const { width: line, dashes } = PENS[pen];
    const dashed = dashes === undefined ? '' : ` stroke-dasharray="${dashes}"`;
    return strokes.length === 0
      ? []
      : [
          `<g id="${pen}" stroke-width="${line}"${dashed}>`,
          ...strokes.map((stroke) => `<path d="${strokePath(stroke)}"/>`),
          '</g>',
        ];
  });
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<svg xmlns="http://www.w3.org/2000/svg" width="${width}mm" height="${height}mm" viewBox="0 0 ${width} ${height}">`,
    `<title>${escaped(drawing.title)}</title>`,
    '<g fill="none" stroke="#000" stroke-linejoin="round">',
    ...groups,
    '</g>',
    '<g fill="#000" font-family="Source Sans 3, Arial, sans-serif">',
    ...drawing.letters.map(letterText),
    '</g>',
    '</svg>',
    '',
  ].join('\n');
}
