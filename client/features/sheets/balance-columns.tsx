import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import type { PrintedSheet } from '#shared/core/printed-sheet.ts';
import type { Plan } from '#shared/core/plan.ts';
import { formatNumber, NO_VALUE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { unitName } from '#shared/units/names.ts';
import type { Quantity } from '#shared/units/quantities.ts';
import { layoutSheet, type SheetRow } from './sheet-layout.ts';

interface BalanceColumnsProps {
  sheet: PrintedSheet;
  plan: Plan;
}

const columnsIn = (units: Units) => {
  const said = (quantity: Quantity) => unitName(units.unit(quantity));
  return [
    { label: `Mass ${units.label('mass')}`, said: `mass in ${said('mass')}` },
    { label: '±', said: `standard uncertainty of the mass in ${said('mass')}` },
    { label: `Arm ${units.label('length')}`, said: `arm aft of the datum in ${said('length')}` },
    { label: units.label('moment'), said: `moment in ${said('moment')}` },
    { label: '%', said: 'share of the mass' },
  ];
};
/** Letters take this share of a row's height. */
const LETTERS = 0.72;

/** The balance table of the page, in one column or two. */
export function BalanceColumns({ sheet, plan }: BalanceColumnsProps) {
  const heads = columnsIn(useUnits());
  const { columns, rowHeight, partsLeftOut } = layoutSheet(sheet, plan.name);
  const size = { fontSize: `${Math.min(3.3, rowHeight * LETTERS)}mm`, lineHeight: `${rowHeight}mm` };
  return (
    <>
      <div
        className={cn(
          'grid items-start gap-x-[6mm]',
          columns.length > 1 && 'sm:grid-cols-2 print:grid-cols-2',
        )}
        style={size}
      >
        {columns.map((rows, i) => (
          <div
            key={i}
            role="region"
            tabIndex={0}
            aria-label={`Balance sheet, part ${i + 1}`}
            className="overflow-x-auto print:overflow-visible"
          >
            <table className="w-full border-collapse">
              <caption className="sr-only">Mass, arm and moment by group and part</caption>
              <thead>
                <tr className="border-b border-graphite text-graphite [&>th]:pl-[1.2mm] [&>th]:font-semibold">
                  <th scope="col" className="!pl-0 text-left">
                    Part
                  </th>
                  {heads.map(({ label, said }) => (
                    <th key={label} scope="col" className="text-right whitespace-nowrap">
                      <abbr title={said}>{label}</abbr>
                    </th>
                  ))}
                </tr>
              </thead>
              <tbody>
                {rows.map((row) => (
                  <Row
                    key={row.key}
                    row={row}
                    digits={sheet.digits}
                    plan={plan}
                    withMaterial={columns.length === 1}
                  />
                ))}
              </tbody>
            </table>
          </div>
        ))}
      </div>
      {partsLeftOut > 0 && (
        <p className="mt-[1mm] text-graphite">
          {partsLeftOut} parts are left to the CSV and JSON files; all are in the sums.
        </p>
      )}
    </>
  );
}

interface RowProps {
  row: SheetRow;
  digits: PrintedSheet['digits'];
  plan: Plan;
  withMaterial: boolean;
}

function Row({ row, digits, plan, withMaterial }: RowProps) {
  const { kind, name, material, figures } = row;
  const show = (text: string | null, column: keyof PrintedSheet['digits']) =>
    text === null ? NO_VALUE : formatNumber(Number(text), digits[column]);
  const wood = withMaterial && material !== null ? plan.materials[material]?.name : undefined;
  return (
    <tr
      className={cn(
        'border-b border-rule [&>td]:pl-[1.2mm] [&>td]:text-right [&>td]:whitespace-nowrap',
        kind !== 'part' && 'font-semibold',
        kind === 'total' && 'border-t border-b-0 border-t-pencil',
      )}
    >
      <th scope="row" className={cn('text-left', kind === 'part' ? 'pl-[2mm] font-normal' : 'font-semibold')}>
        {name}
        {wood && <span className="text-graphite"> {wood}</span>}
      </th>
      <td>{show(figures.mass, 'mass')}</td>
      <td className="text-graphite">{show(figures.u, 'u')}</td>
      <td>{show(figures.arm, 'arm')}</td>
      <td>{show(figures.moment, 'moment')}</td>
      <td>{show(figures.share, 'share')}</td>
    </tr>
  );
}
