import { noticeWords } from '#client/components/notice-text.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Notice } from '#shared/core/notices.ts';
import { printedSheet } from '#shared/core/printed-sheet.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { printingOf } from '#shared/format/printing.ts';
import type { SheetDto } from '#shared/schemas/sheet.ts';
import { BalanceColumns } from './balance-columns.tsx';
import { FiguresBlock } from './figures-block.tsx';
import { PAPER } from './paper.ts';
import { PlanPicture } from './plan-picture.tsx';
import { checkCode, sheetMoment } from './sheet-words.ts';

/** Notices told on the page; the rest is counted. */
const MOST_NOTICES = 4;

/** The balance sheet as one page of A4 or Letter, the title block at its lower right. */
export function SheetPage({ sheet }: { sheet: SheetDto }) {
  const { plan, result } = sheet;
  const units = useUnits();
  const { totals, balance, loading } = result;
  return (
    <article
      aria-label={`Balance sheet ${sheet.number} of ${sheet.gliderName}`}
      style={PAPER}
      className="mx-auto flex w-full max-w-[210mm] flex-col gap-[4mm] border border-strong-rule bg-sheet p-[5mm] text-[3.3mm]/[4.6mm] sm:min-h-[297mm] sm:p-[12mm] print:h-[254mm] print:min-h-0 print:max-w-none print:overflow-hidden print:border-0 print:p-0"
    >
      <header className="flex flex-wrap items-start justify-between gap-[4mm] print:flex-nowrap">
        <div className="min-w-0 flex-1 basis-[60mm]">
          <h1 className="text-[6mm]/[7.2mm] font-semibold">{sheet.gliderName}</h1>
          <p className="mt-[1mm] text-[4.4mm]/[5.6mm] font-semibold">
            {units.format(totals.mass, 'mass')} ±{NARROW_SPACE}
            {units.doubt(totals.u, 'mass')}
            {balance.percentMac !== null &&
              `, balances at ${formatNumber(balance.percentMac, 1)}${NARROW_SPACE}% MAC`}
            {loading.wing !== null && `, ${units.format(loading.wing, 'loading')}`}
          </p>
          {sheet.note && <p className="mt-[1.5mm] line-clamp-3 max-w-[110mm]">{sheet.note}</p>}
        </div>
        <PlanPicture plan={plan} balance={balance.x} className="h-[32mm] max-w-[62mm] shrink-0" />
      </header>
      <section aria-label="Balance sheet">
        <BalanceColumns sheet={printedSheet(result, printingOf(units))} plan={plan} />
      </section>
      <FiguresBlock plan={plan} result={result} />
      <div className="mt-auto grid items-end gap-[4mm] sm:grid-cols-[1fr_auto] print:grid-cols-[1fr_auto]">
        <Cautions sheet={sheet} />
        <TitleBlock sheet={sheet} />
      </div>
    </article>
  );
}

function Cautions({ sheet: { plan, result } }: { sheet: SheetDto }) {
  const units = useUnits();
  // The schema leaves a notice's data open; the core made these.
  const notices = result.notices as Notice[];
  const told = notices.slice(0, MOST_NOTICES);
  const more = notices.length - told.length;
  return (
    <section aria-label="Cautions" className="text-[2.7mm]/[3.7mm]">
      <h2 className="font-semibold">Cautions</h2>
      <ul className="list-disc pl-[4mm]">
        {told.map((notice) => (
          <li key={`${notice.code} ${notice.path}`}>{noticeWords(notice, plan, units).text}</li>
        ))}
        {more > 0 && <li>{more} more on the drawing.</li>}
        <li>
          An estimate from drawing and average wood: weigh the finished model and find its balance before it
          flies.
        </li>
        <li>First flights over empty ground, in light wind, nobody ahead. The field decides.</li>
      </ul>
    </section>
  );
}

function TitleBlock({ sheet }: { sheet: SheetDto }) {
  const cells: readonly (readonly [string, string])[] = [
    ['Sheet', `No. ${sheet.number}`],
    ['Saved', sheetMoment(sheet.savedAt)],
    ['by', sheet.savedBy],
    ['Check code', checkCode(sheet.sha256)],
    ['Calculator', sheet.calculator],
    ['Made with', 'Featherbeam'],
  ];
  return (
    <dl className="grid w-full grid-cols-2 border border-pencil sm:w-[84mm] print:w-[84mm]">
      {cells.map(([label, text]) => (
        <div
          key={label}
          className="border-b border-rule px-[2mm] py-[0.8mm] odd:border-r nth-last-2:border-b-0 last:border-b-0"
        >
          <dt className="text-[2.4mm]/[3mm] text-graphite">{label}</dt>
          <dd className="overflow-hidden text-[3.2mm]/[4mm] font-semibold text-ellipsis whitespace-nowrap">
            {text}
          </dd>
        </div>
      ))}
    </dl>
  );
}
