import { useMemo } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Menu, MenuItem } from '#client/components/ui/menu.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Solid } from '#shared/core/plan.ts';
import { fitsSolid } from '#shared/plan-start/fits.ts';
import { freshId, freshName } from '#shared/plan-start/names.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import { inTable, preferred } from '../edits/materials.ts';
import { newSolid, SOLID_CHOICES } from '../edits/new-rows.ts';
import { changeSolids, dropUnused, inTurn, keepMaterial } from '../edits/plan-edits.ts';
import { withRow } from '../edits/rows.ts';
import type { Form } from '../forms/form.ts';
import { SolidForm } from '../forms/solid-form.tsx';
import type { RowWords } from './row-group.tsx';
import { RowsPane, type Desk } from './rows-pane.tsx';
import { solidSize } from './size-text.ts';

interface SolidsPaneProps {
  desk: Desk;
  table: readonly TableMaterial[];
}

/** Sticks, tubes and plates outside the surfaces. */
export function SolidsPane({ desk, table }: SolidsPaneProps) {
  const { solids } = desk.plan;
  const units = useUnits();
  const words = useMemo(
    (): RowWords<Solid> => ({
      lineOf: ({ id }) => `solid/${id}`,
      sizeOf: (solid) => solidSize(solid, units),
    }),
    [units],
  );
  const add = ({ choice, wishes }: (typeof SOLID_CHOICES)[number]) => {
    const bare = newSolid(choice);
    const material = preferred(desk.plan, table, fitsSolid(bare), wishes);
    const solid: Solid = {
      ...bare,
      id: freshId(
        choice,
        solids.map((s) => s.id),
      ),
      name: freshName(
        bare.name,
        solids.map((s) => s.name),
      ),
      material: material?.key ?? '',
    };
    const recipe = changeSolids((all) => [...all, solid]);
    desk.edit(
      material ? inTurn(keepMaterial(material.key, material.material), recipe) : recipe,
      `add ${solid.id}`,
    );
    desk.wish.ask(`solid/${solid.id}`, 'form');
    desk.pick(`solid/${solid.id}`);
  };
  return (
    <RowsPane
      desk={desk}
      title="Sticks, tubes and plates"
      sizeHead={units.label('length')}
      rows={solids}
      words={words}
      pathOf={(i) => `solids/${i}`}
      change={changeSolids}
      empty="Nothing yet. Fuselage sides, booms, blocks and joiners go here."
      add={
        <Menu align="start" trigger={<Button>Add a solid</Button>}>
          {SOLID_CHOICES.map((choice) => (
            <MenuItem key={choice.choice} onSelect={() => add(choice)}>
              {choice.label}
            </MenuItem>
          ))}
        </Menu>
      }
      formOf={(solid, at) => <OneSolid desk={desk} table={table} solid={solid} at={at} />}
    />
  );
}

function OneSolid({ desk, table, solid, at }: SolidsPaneProps & { solid: Solid; at: number }) {
  const change = (fn: (solid: Solid) => Solid) => changeSolids((all) => withRow(all, solid.id, fn));
  const form: Form<Solid> = {
    value: solid,
    // The fields come from this solid's own shape, so the result is of that shape again.
    set: (changes, field) =>
      desk.edit(
        change((s) => ({ ...s, ...changes }) as Solid),
        `solid ${solid.id}: ${field}`,
      ),
    issue: (path) => desk.issues.get(`solids/${at}/${path}`),
    readOnly: !desk.canEdit,
  };
  return (
    <SolidForm
      key={solid.id}
      form={form}
      materials={desk.plan.materials}
      table={table}
      onMaterial={({ key, material }) =>
        desk.edit(
          inTurn(
            keepMaterial(key, material),
            change((s) => ({ ...s, material: key })),
            dropUnused(solid.material, inTable(table)),
          ),
          `solid ${solid.id}: material`,
        )
      }
    />
  );
}
