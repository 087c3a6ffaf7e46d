import { useMemo } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Item } from '#shared/core/plan.ts';
import { freshId, freshName } from '#shared/plan-start/names.ts';
import { newItem } from '../edits/new-rows.ts';
import { changeItems } from '../edits/plan-edits.ts';
import { withRow } from '../edits/rows.ts';
import type { Form } from '../forms/form.ts';
import { ItemForm } from '../forms/item-form.tsx';
import type { RowWords } from './row-group.tsx';
import { RowsPane, type Desk } from './rows-pane.tsx';
import { itemPlace } from './size-text.ts';

/** Whatever has a mass and an arm: gear, fittings, ballast. */
export function ItemsPane({ desk }: { desk: Desk }) {
  const { items } = desk.plan;
  const units = useUnits();
  const words = useMemo(
    (): RowWords<Item> => ({ lineOf: ({ id }) => `item/${id}`, sizeOf: (item) => itemPlace(item, units) }),
    [units],
  );
  const add = () => {
    const bare = newItem();
    const item: Item = {
      ...bare,
      id: freshId(
        'item',
        items.map(({ id }) => id),
      ),
      name: freshName(
        bare.name,
        items.map(({ name }) => name),
      ),
    };
    desk.edit(
      changeItems((all) => [...all, item]),
      `add ${item.id}`,
    );
    desk.wish.ask(`item/${item.id}`, 'form');
    desk.pick(`item/${item.id}`);
  };
  return (
    <RowsPane
      desk={desk}
      title="Gear, fittings, ballast"
      sizeHead={`${units.label('length')} aft`}
      rows={items}
      words={words}
      pathOf={(i) => `items/${i}`}
      change={changeItems}
      empty="Nothing yet. Whatever has a mass and a place goes here: gear, wire, ballast."
      add={<Button onClick={add}>Add an item</Button>}
      formOf={(item, at) => <OneItem desk={desk} item={item} at={at} />}
    />
  );
}

function OneItem({ desk, item, at }: { desk: Desk; item: Item; at: number }) {
  const form: Form<Item> = {
    value: item,
    set: (changes, field) =>
      desk.edit(
        changeItems((all) => withRow(all, item.id, (i) => ({ ...i, ...changes }))),
        `item ${item.id}: ${field}`,
      ),
    issue: (path) => desk.issues.get(`items/${at}/${path}`),
    readOnly: !desk.canEdit,
  };
  return <ItemForm key={item.id} form={form} />;
}
