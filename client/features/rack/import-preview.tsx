import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { ImportPreviewDto } from '#shared/schemas/rack.ts';
import { columnText, previewHeadline } from './import-words.ts';
import { KIND_WORDS, sizeText } from './words.ts';

/** Rows of good lines that are drawn; the rest is counted. */
const SHOWN = 100;

/** What a file would bring in: first what is wrong with it, then what it holds. */
export function ImportPreview({ preview }: { preview: ImportPreviewDto }) {
  const units = useUnits();
  const { columns, rows, bad } = preview;
  return (
    <div className="mt-4">
      <p role="status" className="font-semibold">
        {previewHeadline(preview)}
      </p>
      <p className="mt-1 text-note text-graphite">Columns: {columns.map(columnText).join('; ')}.</p>
      {bad.length > 0 && (
        <Table caption="Lines that cannot be taken in" showCaption className="mt-4 text-note">
          <thead>
            <tr>
              <Th numeric>Line</Th>
              <Th>As it stands</Th>
              <Th>Why not</Th>
            </tr>
          </thead>
          <tbody>
            {bad.map(({ line, text, problems }) => (
              <Tr key={line}>
                <RowTh className="text-right">{line}</RowTh>
                <Td className="max-w-60 py-1 break-words">{text}</Td>
                <Td className="py-1">
                  {problems.map(({ column, detail }, i) => (
                    <span key={i} className="block text-red">
                      <span aria-hidden="true">▲ </span>
                      {column === null ? detail : `${column}: ${detail}`}
                    </span>
                  ))}
                </Td>
              </Tr>
            ))}
          </tbody>
        </Table>
      )}
      {rows.length > 0 && (
        <Table caption="Pieces to be taken in" showCaption className="mt-4 text-note">
          <thead>
            <tr>
              <Th numeric>Line</Th>
              <Th>Piece</Th>
              <Th numeric>Size</Th>
              <Th numeric>Mass</Th>
              <Th>Look at it</Th>
            </tr>
          </thead>
          <tbody>
            {rows.slice(0, SHOWN).map(({ line, piece, doubt }) => (
              <Tr key={line}>
                <RowTh className="text-right">{line}</RowTh>
                <Td>
                  {KIND_WORDS[piece.kind]}, {piece.material.name}
                </Td>
                <Td numeric>{sizeText(piece, units)}</Td>
                <Td numeric>{units.format(piece.mass, 'mass')}</Td>
                <Td className="text-ochre">
                  {doubt !== null && <span aria-hidden="true">◆ </span>}
                  {doubt}
                </Td>
              </Tr>
            ))}
          </tbody>
        </Table>
      )}
      {rows.length > SHOWN && <p className="mt-1 text-note">And {rows.length - SHOWN} more.</p>}
    </div>
  );
}
