import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { cutList } from '#shared/core/cut/cut-list.ts';
import { cutParts, THICKEST_SHEET } from '#shared/core/cut/cut-parts.ts';
import { INCH_SIZES, METRIC_SIZES } from '#shared/core/cut/shop-sizes.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { AssignSection } from './assign/assign-section.tsx';
import { cutTerms, USUAL_TERMS, type CutTerms } from './cut-terms.ts';
import { freePieces } from './rack-pieces.ts';
import { sheetGroups } from './sheet-groups.ts';
import { SheetSection } from './sheet-section.tsx';
import { ShoppingSection } from './shopping-section.tsx';
import { shoppingList } from './shopping.ts';
import { stickGroups } from './stick-groups.ts';
import { StickSection } from './stick-section.tsx';
import { cutHeadline } from './words.ts';

const NONE: readonly StockPieceDto[] = [];

/** What is cut, from what, and what has to be bought. */
export function CutPlace({ workspace, person }: { workspace: Workspace; person: string }) {
  const plan = useValidPlan(workspace);
  const [terms, keep] = useKept<CutTerms>(`featherbeam.cut.${person}`, cutTerms, USUAL_TERMS);
  const { data: rack = NONE } = useQuery({ ...freePieces, enabled: workspace.kind === 'saved' });
  const units = useUnits();
  const sizes = units.system === 'inch' ? INCH_SIZES : METRIC_SIZES;
  const list = useMemo(() => (plan ? cutList(plan) : { sticks: [], ribs: [] }), [plan]);
  const groups = useMemo(() => stickGroups(list.sticks, terms, rack), [list, terms, rack]);
  const sheets = useMemo(
    () => (plan ? sheetGroups(plan, terms, { rack, sizes }) : []),
    [plan, terms, rack, sizes],
  );
  if (!plan) return null;
  const { title, text } = cutHeadline(list, groups, sheets);
  const blocks = cutParts(plan).filter(
    ({ form, thickness }) => form === 'sheet' && thickness > THICKEST_SHEET,
  );
  const lines = shoppingList(sheets, groups, blocks, { sizes, stick: terms.bought });
  const longest = Math.max(
    1,
    ...groups.flatMap(({ packing }) => packing.sticks.map(({ length }) => length)),
    ...sheets.flatMap(({ packing }) => packing.sheets.map(({ length }) => length)),
  );
  return (
    <div className="px-4 pt-5 pb-8 sm:px-7">
      <header className="flex flex-wrap items-start gap-x-6 gap-y-2">
        <div className="min-w-[min(18rem,100%)] flex-1">
          <h1 className="text-figure font-semibold">{title}</h1>
          <p className="mt-1 text-graphite">{text}</p>
        </div>
        <Button onClick={() => window.print()} className="print:hidden">
          Print with boxes to tick
        </Button>
      </header>
      <Terms terms={terms} onTerms={keep} />
      <Notice tone="ochre" word="Knife and saw:" className="mt-4 max-w-3xl print:hidden">
        cut away from your hand against a steel rule, wear a mask for dust, keep thin glue off skin and eyes.
      </Notice>
      <ShoppingSection plan={plan} lines={lines} />
      {groups.map((group) => (
        <StickSection key={group.key} plan={plan} group={group} longest={longest} />
      ))}
      {sheets.map((group) => (
        <SheetSection key={group.key} plan={plan} group={group} longest={longest} />
      ))}
      {workspace.kind === 'saved' && <AssignSection workspace={workspace} plan={plan} />}
    </div>
  );
}

function Terms({ terms, onTerms }: { terms: CutTerms; onTerms: (terms: CutTerms) => void }) {
  const set = (changes: Partial<CutTerms>) => {
    const next = cutTerms.safeParse({ ...terms, ...changes });
    if (next.success) onTerms(next.data);
  };
  const field = (key: 'bought' | 'kerf' | 'shortestOffcut', label: string, min: number, max: number) => (
    <NumberField
      label={label}
      quantity="length"
      value={terms[key]}
      min={min}
      max={max}
      onChange={(value) => value !== null && set({ [key]: value })}
    />
  );
  return (
    <section aria-label="Stock and saw" className="mt-4 print:hidden">
      <div className="grid max-w-4xl grid-cols-1 gap-x-6 sm:grid-cols-2 lg:grid-cols-4">
        {field('bought', 'Sticks are sold at', 50, 6_000)}
        {field('kerf', 'A cut takes', 0, 10)}
        {field('shortestOffcut', 'Kept from', 0, 2_000)}
        <NumberField
          label="Scarf, 1 to"
          quantity="ratio"
          value={terms.slope}
          min={8}
          max={30}
          step={1}
          onChange={(value) => value !== null && set({ slope: value })}
        />
      </div>
    </section>
  );
}
