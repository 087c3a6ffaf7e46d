import { Link } from 'react-router-dom';
import { Amount } from '#client/components/ui/amount.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { RackOrder } from '#shared/schemas/rack.ts';
import { PieceState } from './piece-state.tsx';
import { orderedBy } from './rack-view.ts';
import type { PiecesProps } from './rack.tsx';
import { gradeWord, KIND_WORDS, sizeText } from './words.ts';

const BOX = 'size-4.5 accent-ink pointer-coarse:size-6';

/** The rack as a ruled table. */
export function RackTable({ pieces, view, onView, chosen, onChosen, ...links }: PiecesProps) {
  const units = useUnits();
  const heading = (order: RackOrder, label: string, numeric = true) => (
    <Th
      numeric={numeric}
      aria-sort={view.order !== order ? undefined : view.direction === 'asc' ? 'ascending' : 'descending'}
    >
      <button
        type="button"
        onClick={() => onView(orderedBy(view, order))}
        className={cn(
          'inline-flex min-h-row items-center gap-1 font-semibold whitespace-nowrap hover:text-ink',
          numeric && 'flex-row-reverse',
          view.order === order && 'text-pencil',
        )}
      >
        {label}
        <span aria-hidden="true" className="w-2 text-[0.625rem]">
          {view.order !== order ? '' : view.direction === 'asc' ? '▲' : '▼'}
        </span>
      </button>
    </Th>
  );
  const all = pieces.every(({ id }) => chosen.has(id));
  return (
    <Table caption="Pieces on the rack">
      <thead>
        <tr>
          <Th className="w-9">
            <input
              type="checkbox"
              aria-label="Choose all that are shown for labels"
              checked={all}
              onChange={() => onChosen(new Set(all ? [] : pieces.map(({ id }) => id)))}
              className={cn(BOX, 'block')}
            />
          </Th>
          {heading('number', 'Number', false)}
          <Th>Kind</Th>
          {heading('material', 'Material', false)}
          {heading('length', 'Size')}
          {heading('mass', 'Mass')}
          {heading('density', 'Density')}
          <Th className="pl-5">Grade</Th>
          <Th>Cut</Th>
          <Th>State</Th>
        </tr>
      </thead>
      <tbody>
        {pieces.map((piece) => (
          <Tr key={piece.id} lit={chosen.has(piece.id)}>
            <Td>
              <input
                type="checkbox"
                aria-label={`Choose piece ${piece.number} for labels`}
                checked={chosen.has(piece.id)}
                onChange={() => onChosen(toggled(chosen, piece.id))}
                className={cn(BOX, 'block')}
              />
            </Td>
            <RowTh>
              <Link
                to={links.pieceHref(piece.id)}
                className="link inline-flex min-h-row items-center font-semibold"
              >
                <span className="sr-only">Piece </span>
                {piece.number}
              </Link>
            </RowTh>
            <Td>{KIND_WORDS[piece.kind]}</Td>
            <Td>{piece.material.name}</Td>
            <Td numeric>{sizeText(piece, units)}</Td>
            <Td numeric>
              <Amount value={piece.mass} quantity="mass" />
              {!piece.weighed && piece.mass !== null && <WorkedOut />}
            </Td>
            <Td numeric>
              <Amount value={piece.density} quantity="density" />
            </Td>
            <Td className="pl-5">{piece.grade || gradeWord(piece.material, piece.density)}</Td>
            <Td>{piece.grainCut}</Td>
            <Td>
              <PieceState piece={piece} gliderHref={links.gliderHref} />
            </Td>
          </Tr>
        ))}
      </tbody>
    </Table>
  );
}

/** The mass was shared out and not read from a scale. */
export function WorkedOut() {
  return <span className="block text-note text-graphite">worked out</span>;
}

export function toggled(chosen: ReadonlySet<string>, id: string): ReadonlySet<string> {
  const next = new Set(chosen);
  if (!next.delete(id)) next.add(id);
  return next;
}
