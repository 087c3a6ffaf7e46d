import { useQueries } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { densityText } from './figures.ts';
import { LABEL_SHEETS, pagesOf } from './label-sheets.ts';
import { QrCode } from './qr-code.tsx';
import { rackQueries } from './queries.ts';
import { KIND_WORDS, sizeText } from './words.ts';

interface LabelsProps {
  ids: readonly string[];
  pieceHref: (id: string) => string;
  rackHref: string;
}

/** Labels of pieces, to be printed on sheets of labels or one to a page. */
export function Labels({ ids, pieceHref, rackHref }: LabelsProps) {
  const [form, setForm] = useState(0);
  const queries = useQueries({ queries: ids.map((id) => rackQueries.piece(id)) });
  const pieces = queries.flatMap(({ data }) => (data ? [data] : []));
  const missing = queries.filter(({ isError }) => isError).length;
  const pending = queries.some(({ isPending }) => isPending);
  const sheet = LABEL_SHEETS[form] ?? LABEL_SHEETS[0];
  return (
    <>
      <div className="no-print">
        <Link to={rackHref} className="link inline-flex min-h-row items-center text-note">
          Rack
        </Link>
        <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
          <div className="mr-auto">
            <h1 className="text-figure font-semibold">Labels</h1>
            <p role="status" className="mt-1 text-graphite">
              {pending ? 'Fetching the pieces …' : headline(pieces.length)}
            </p>
          </div>
          <div className="w-72 max-sm:w-full">
            <Select
              label="Paper"
              keepRoom={false}
              options={LABEL_SHEETS.map(({ name }, i) => ({ value: String(i), label: name }))}
              value={String(form)}
              onValue={(value) => setForm(Number(value))}
            />
          </div>
          <Button variant="primary" onClick={() => print()} disabled={pending || pieces.length === 0}>
            Print
          </Button>
        </div>
        {pieces.length > 0 && (
          <p className="mt-3 text-note text-graphite">
            Print at 100 %, without fitting to the page, or the labels miss their places.
          </p>
        )}
        {missing > 0 && (
          <Notice tone="ochre" className="mt-3" word="Not all are here.">
            {missing === 1 ? 'One piece was' : `${missing} pieces were`} not found, or not fetched. Reload the
            page to try again.
          </Notice>
        )}
      </div>
      <div className="mt-5 overflow-x-auto print:mt-0 print:overflow-visible">
        {pagesOf(pieces, sheet).map((page, i) => (
          <ul key={i} aria-label={`Page ${i + 1}`} className={`label-page ${sheet.className}`}>
            {page.map((piece) => (
              <Label key={piece.id} piece={piece} href={pieceHref(piece.id)} />
            ))}
          </ul>
        ))}
      </div>
    </>
  );
}

function headline(count: number): string {
  if (count === 0) return 'No piece was chosen. Choose some on the rack.';
  return count === 1
    ? '1 label; its code opens the piece’s page.'
    : `${count} labels; each code opens its piece’s page.`;
}

function Label({ piece, href }: { piece: StockPieceDto; href: string }) {
  const units = useUnits();
  return (
    <li className="label">
      <QrCode
        text={new URL(href, location.origin).href}
        label={`Code that opens piece ${piece.number}`}
        className="label-code"
      />
      <div className="min-w-0">
        <p className="label-number">{piece.number}</p>
        <p className="truncate">
          {KIND_WORDS[piece.kind]}, {piece.material.name}
        </p>
        <p>{sizeText(piece, units)}</p>
        <p>{piece.density === null ? 'not weighed' : densityText(piece.material, piece.density, units)}</p>
        {(piece.grade !== '' || piece.grainCut !== null) && (
          <p className="truncate">
            {[piece.grade, piece.grainCut === null ? '' : `cut ${piece.grainCut}`].filter(Boolean).join(', ')}
          </p>
        )}
      </div>
    </li>
  );
}
