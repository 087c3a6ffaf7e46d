import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { QueryView } from '#client/components/query-view.tsx';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import type { SheetDto } from '#shared/schemas/sheet.ts';
import { fileHref, sheetQueries } from './queries.ts';
import { SheetPage } from './sheet-page.tsx';

interface SheetViewProps {
  sheetId: string;
  /** where the glider's sheets are listed */
  gliderHref: (gliderId: string) => string;
}

/** A saved sheet as it is printed, with its files. */
export function SheetView({ sheetId, gliderHref }: SheetViewProps) {
  const query = useQuery(sheetQueries.detail(sheetId));
  return <QueryView query={query}>{(sheet) => <Opened sheet={sheet} gliderHref={gliderHref} />}</QueryView>;
}

function Opened({ sheet, gliderHref }: { sheet: SheetDto; gliderHref: (gliderId: string) => string }) {
  useTitle(`${sheet.gliderName}, sheet ${sheet.number}`);
  return (
    <>
      <div className="no-print mx-auto flex w-full max-w-[210mm] flex-wrap items-center gap-2 py-3">
        <Link to={gliderHref(sheet.gliderId)} className="link mr-auto inline-flex min-h-row items-center">
          All sheets of {sheet.gliderName}
        </Link>
        <a href={fileHref(sheet.id, 'csv')} download className={buttonClass('quiet')}>
          CSV
        </a>
        <a href={fileHref(sheet.id, 'json')} download className={buttonClass('quiet')}>
          JSON
        </a>
        <Button variant="primary" onClick={() => window.print()}>
          Print
        </Button>
      </div>
      <SheetPage sheet={sheet} />
    </>
  );
}
