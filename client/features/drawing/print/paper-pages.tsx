import { useEffect } from 'react';
import { createPortal } from 'react-dom';
import type { Pages } from '#shared/drawing/paper/pages.ts';
import { PageSheet } from './page-sheet.tsx';

/** Only these pages go to the printer, each on a paper of its own; on the screen they are not seen. */
const rules = (width: number, height: number) => `
  @page { size: ${width}mm ${height}mm; margin: 0; }
  @media screen { .true-pages { display: none; } }
  @media print {
    body > :not(.true-pages) { display: none !important; }
    body { background: var(--sheet); }
    .true-page { display: block; break-after: page; break-inside: avoid; }
    .true-page:last-child { break-after: auto; }
  }
`;

/** The pages as they are printed while this is shown. */
export function PaperPages({ pages }: { pages: Pages }) {
  const { width, height } = pages.paper;
  useEffect(() => {
    const sheet = new CSSStyleSheet();
    sheet.replaceSync(rules(width, height));
    document.adoptedStyleSheets = [...document.adoptedStyleSheets, sheet];
    return () => {
      document.adoptedStyleSheets = document.adoptedStyleSheets.filter((other) => other !== sheet);
    };
  }, [width, height]);
  return createPortal(
    <div className="true-pages" aria-hidden="true">
      {pages.pages.map((page) => (
        <PageSheet key={page.number} pages={pages} page={page} />
      ))}
    </div>,
    document.body,
  );
}
