import { useMemo } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Menu, MenuItem, MenuLine } from '#client/components/ui/menu.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Part, Surface } from '#shared/core/plan.ts';
import { newPart, type PartChoice } from '#shared/plan-start/new-part.ts';
import { newSet, type SetChoice, type SetPart } from '#shared/plan-start/part-sets.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import { PART_CHOICES, SET_CHOICES, withParts } from '../edits/add-parts.ts';
import { inTable } from '../edits/materials.ts';
import { changeParts, dropUnused, inTurn, keepMaterial } from '../edits/plan-edits.ts';
import { withRow } from '../edits/rows.ts';
import type { Form } from '../forms/form.ts';
import { PartForm } from '../forms/part-form.tsx';
import { PanelsTable } from './panels-table.tsx';
import type { RowWords } from './row-group.tsx';
import { RowsPane, type Desk } from './rows-pane.tsx';
import { SectionsTable } from './sections-table.tsx';
import { partNote, partSize } from './size-text.ts';
import { SurfaceSettings } from './surface-settings.tsx';

interface SurfacePaneProps {
  desk: Desk;
  surface: Surface;
  index: number;
  table: readonly TableMaterial[];
  onRemoved: () => void;
}

/** One surface on the left of its drawing: panels, sections, parts. */
export function SurfacePane({ desk, surface, index, table, onRemoved }: SurfacePaneProps) {
  const units = useUnits();
  const { key } = surface;
  const words = useMemo(
    (): RowWords<Part> => ({
      lineOf: ({ id }) => `${key}/${id}`,
      noteOf: partNote,
      sizeOf: (part) => partSize(part, units),
    }),
    [key, units],
  );
  const change = (parts: (parts: Part[]) => Part[]) => changeParts(index, parts);
  const put = (added: readonly SetPart[]) => {
    const { recipe, lines } = withParts(desk.plan, surface, index, added, table);
    const first = lines[0] ?? null;
    desk.edit(recipe, `add ${lines.join(', ')}`);
    desk.wish.ask(first, lines.length === 1 ? 'form' : 'row', true);
    desk.pick(first);
  };
  const add = (choice: PartChoice) => put([{ choice, part: newPart(choice, surface) }]);
  const addSet = (choice: SetChoice) => put(newSet(choice, surface));
  return (
    <div className="grid gap-y-6">
      <div>
        <PanelsTable desk={desk} surface={surface} index={index} />
        <SectionsTable desk={desk} surface={surface} index={index} />
      </div>
      <RowsPane
        desk={desk}
        title="Parts"
        sizeHead={units.label('length')}
        rows={surface.parts}
        words={words}
        pathOf={(i) => `surfaces/${index}/parts/${i}`}
        change={change}
        empty="No parts yet. Begin with ribs and spars, or with a sheet for a plate tail."
        add={<AddPart onAdd={add} onSet={addSet} />}
        formOf={(part, i) => (
          <OnePart desk={desk} surface={surface} index={index} table={table} part={part} at={i} />
        )}
      />
      <SurfaceSettings desk={desk} surface={surface} index={index} onRemoved={onRemoved} />
    </div>
  );
}

interface OnePartProps extends Omit<SurfacePaneProps, 'onRemoved'> {
  part: Part;
  at: number;
}

function OnePart({ desk, surface, index, table, part, at }: OnePartProps) {
  const change = (fn: (part: Part) => Part, what: string) =>
    desk.edit(
      changeParts(index, (parts) => withRow(parts, part.id, fn)),
      `${surface.key}/${part.id}: ${what}`,
    );
  const form: Form<Part> = {
    value: part,
    // The fields come from this part's own kind, so the result is of that kind again.
    set: (changes, field) => change((p) => ({ ...p, ...changes }) as Part, field),
    issue: (path) => desk.issues.get(`surfaces/${index}/parts/${at}/${path}`),
    readOnly: !desk.canEdit,
  };
  const onMaterial = ({ key, material }: TableMaterial) =>
    desk.edit(
      inTurn(
        keepMaterial(key, material),
        changeParts(index, (parts) => withRow(parts, part.id, (p) => ({ ...p, material: key }))),
        dropUnused(part.material, inTable(table)),
      ),
      `${surface.key}/${part.id}: material`,
    );
  return (
    <PartForm
      key={part.id}
      form={form}
      mirrored={surface.mirrored}
      materials={desk.plan.materials}
      table={table}
      onMaterial={onMaterial}
    />
  );
}

interface AddPartProps {
  onAdd: (choice: PartChoice) => void;
  onSet: (choice: SetChoice) => void;
}

function AddPart({ onAdd, onSet }: AddPartProps) {
  return (
    <Menu align="start" trigger={<Button>Add a part</Button>}>
      <p className="caption px-3 pt-1.5 pb-1">Together, in sizes that suit</p>
      {SET_CHOICES.map(({ choice, label }) => (
        <MenuItem key={choice} onSelect={() => onSet(choice)}>
          {label}
        </MenuItem>
      ))}
      <MenuLine />
      <p className="caption px-3 pt-1.5 pb-1">One by one</p>
      {PART_CHOICES.map(({ choice, label }) => (
        <MenuItem key={choice} onSelect={() => onAdd(choice)}>
          {label}
        </MenuItem>
      ))}
    </Menu>
  );
}
