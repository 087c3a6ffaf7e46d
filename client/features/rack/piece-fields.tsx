import type { Ref } from 'react';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useMaterialTable } from '#client/hooks/use-material-table.ts';
import { stockKind } from '#shared/schemas/stock-piece.ts';
import { stockMaterials, type DraftErrors, type PieceDraft } from './draft.ts';
import { KIND_WORDS } from './words.ts';

interface PieceFieldsProps {
  draft: PieceDraft;
  errors: DraftErrors;
  onDraft: (change: Partial<PieceDraft>) => void;
  firstRef?: Ref<HTMLSelectElement>;
  massRef?: Ref<HTMLInputElement>;
}

const KINDS = stockKind.options.map((value) => ({ value, label: KIND_WORDS[value] }));

/** What a piece is, how large, and what it weighs: the fields of the bench, in the order in which one measures. */
export function PieceFields({ draft, errors, onDraft, firstRef, massRef }: PieceFieldsProps) {
  const materials = stockMaterials(useMaterialTable('saved'), draft.material);
  const chosen = materials.findIndex(
    ({ key, name }) => key === draft.material?.key && (key !== null || name === draft.material.name),
  );
  const number = (
    field: 'length' | 'width' | 'thickness' | 'wall' | 'mass',
    label: string,
    inputRef?: Ref<HTMLInputElement>,
  ) => (
    <NumberField
      label={label}
      quantity={field === 'mass' ? 'mass' : 'length'}
      // What is missing is told when the form is sent, and not of a field that nobody came to yet.
      optional
      value={draft[field]}
      // A text that is no number must not pass as an empty field.
      onChange={(value, problem) =>
        onDraft({ [field]: problem === null || problem === 'missing' ? value : NaN })
      }
      error={errors[field]}
      {...(inputRef ? { inputRef } : {})}
    />
  );
  const tube = draft.kind === 'tube';
  return (
    <div className="grid grid-cols-2 gap-x-4 gap-y-1 sm:grid-cols-4 lg:grid-cols-[8rem_minmax(10rem,18rem)_repeat(4,minmax(8rem,12rem))]">
      <Select
        label="Kind"
        {...(firstRef ? { selectRef: firstRef } : {})}
        options={KINDS}
        value={draft.kind}
        onValue={(value) => onDraft({ kind: stockKind.parse(value) })}
      />
      <Select
        label="Material"
        options={[
          { value: '-1', label: 'Choose …', disabled: true },
          ...materials.map(({ name }, i) => ({ value: String(i), label: name })),
        ]}
        value={String(chosen)}
        onValue={(value) => onDraft({ material: materials[Number(value)] ?? null })}
        error={errors.material}
      />
      {number('length', 'Length')}
      {number('width', tube ? 'Diameter' : 'Width')}
      {tube ? number('wall', 'Wall, if hollow') : number('thickness', 'Thickness')}
      {number('mass', 'Mass', massRef)}
    </div>
  );
}
