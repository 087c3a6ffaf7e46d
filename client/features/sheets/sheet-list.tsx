import { Link } from 'react-router-dom';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { SheetSummaryDto } from '#shared/schemas/sheet.ts';
import { sheetMoment } from './sheet-words.ts';

interface SheetListProps {
  sheets: readonly SheetSummaryDto[];
  sheetHref: (id: string) => string;
}

/** Saved sheets, newest first. */
export function SheetList({ sheets, sheetHref }: SheetListProps) {
  const units = useUnits();
  return (
    <Table caption="Saved balance sheets">
      <thead>
        <tr>
          <Th>Sheet</Th>
          <Th>Saved</Th>
          <Th>by</Th>
          <Th numeric>Mass {units.label('mass')}</Th>
          <Th numeric>Balance % MAC</Th>
          <Th numeric>Loading {units.label('loading')}</Th>
          <Th>Note</Th>
        </tr>
      </thead>
      <tbody>
        {sheets.map((sheet) => (
          <Tr key={sheet.id}>
            <RowTh className="py-0">
              <Link
                to={sheetHref(sheet.id)}
                className="link inline-flex min-h-row items-center font-semibold whitespace-nowrap"
              >
                No. {sheet.number}
              </Link>
            </RowTh>
            <Td className="whitespace-nowrap">
              <time dateTime={sheet.savedAt}>{sheetMoment(sheet.savedAt)}</time>
            </Td>
            <Td>{sheet.savedBy}</Td>
            <Td numeric>{units.format(sheet.mass, 'mass', { bare: true })}</Td>
            <Td numeric>{units.format(sheet.percentMac, 'percentMac', { bare: true })}</Td>
            <Td numeric>{units.format(sheet.wingLoading, 'loading', { bare: true })}</Td>
            <Td className="min-w-48 py-1.5">
              <span className="line-clamp-2">{sheet.note}</span>
            </Td>
          </Tr>
        ))}
      </tbody>
    </Table>
  );
}
