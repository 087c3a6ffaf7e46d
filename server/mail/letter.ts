/** A mail before it is laid out: what it is about, what to do, and what else to know. */
export interface Letter {
  subject: string;
  /** paragraphs, plain text */
  lines: readonly string[];
  /** what to press, and where it leads */
  action?: { label: string; href: string };
  /** small print after the action */
  notes?: readonly string[];
}

const SIGN_OFF = 'Featherbeam, the balance sheet of light gliders';

/** The letter as plain text, for mail programs that show nothing else. */
export function letterText({ lines, action, notes = [] }: Letter): string {
  const parts = [...lines, ...(action ? [`${action.label}:\n${action.href}`] : []), ...notes];
  return `${parts.join('\n\n')}\n\n-- \n${SIGN_OFF}\n`;
}

/** The letter as HTML: tables and inline styles, for mail programs know little else; no pictures, nothing fetched. */
export function letterHtml(letter: Letter): string {
  const { subject, lines, action, notes = [] } = letter;
  const paragraph = (text: string, style: string) =>
    `<p style="margin:0 0 14px;${style}">${escape(text)}</p>`;
  const button = action
    ? `<p style="margin:22px 0"><a href="${escape(action.href)}" style="display:inline-block;padding:11px 20px;` +
      `background:#1d4f91;color:#ffffff;text-decoration:none;font-weight:600;border-radius:3px">${escape(action.label)}</a></p>` +
      `<p style="margin:0 0 14px;font-size:13px;color:#69655b;word-break:break-all">${escape(action.href)}</p>`
    : '';
  return (
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>${escape(subject)}</title></head>` +
    `<body style="margin:0;padding:24px 12px;background:#f4f1e8">` +
    `<table role="presentation" align="center" width="100%" style="max-width:520px;margin:0 auto;background:#fdfbf6;` +
    `border:1px solid #b9b2a0;border-collapse:separate"><tr><td style="padding:28px 28px 18px;` +
    `font:16px/1.5 'Source Sans 3','Segoe UI',Arial,sans-serif;color:#2a2926">` +
    `<h1 style="margin:0 0 16px;font-size:20px;line-height:1.3">${escape(subject)}</h1>` +
    lines.map((line) => paragraph(line, '')).join('') +
    button +
    notes.map((note) => paragraph(note, 'font-size:14px;color:#69655b')).join('') +
    `<p style="margin:20px 0 0;padding-top:12px;border-top:1px solid #d8d2c2;font-size:13px;color:#69655b">${SIGN_OFF}</p>` +
    `</td></tr></table></body></html>`
  );
}

const SIGNS: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };
const escape = (text: string) => text.replace(/[&<>"']/g, (sign) => SIGNS[sign] ?? sign);
