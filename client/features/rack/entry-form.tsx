import { useEffect, useRef, useState, type FormEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { refusalOf } from '#client/lib/refusal.ts';
import { useUnits } from '#client/lib/units.ts';
import { grainCut } from '#shared/schemas/stock-piece.ts';
import { BLANK_PIECE, draftOf, nextLike, pieceOf, type DraftErrors, type PieceDraft } from './draft.ts';
import { densityText, densityWhileTyping } from './figures.ts';
import { useAddPiece } from './mutations.ts';
import { PieceFields } from './piece-fields.tsx';
import { KIND_WORDS } from './words.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

const FIELDS = ['material', 'length', 'width', 'thickness', 'wall', 'mass'] as const;

/** Puts pieces on the rack one after another without leaving the keyboard: Enter adds, and only the mass is new. */
export function EntryForm({ last }: { last: StockPieceDto | undefined }) {
  const units = useUnits();
  const [draft, setDraft] = useState<PieceDraft>(BLANK_PIECE);
  const [errors, setErrors] = useState<DraftErrors>({});
  const [added, setAdded] = useState<StockPieceDto | null>(null);
  const form = useRef<HTMLFormElement>(null);
  const mass = useRef<HTMLInputElement>(null);
  const latest = useRef(draft);
  useEffect(() => {
    latest.current = draft;
  });
  const failed = useRef(new Map<string, string>());
  const queue = useRef(Promise.resolve());
  const mutation = useAddPiece();
  const change = (next: Partial<PieceDraft>) => {
    setDraft((before) => ({ ...before, ...next }));
    setErrors({});
  };
  const model = added ?? last;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const read = pieceOf(draft);
    if ('errors' in read) {
      setErrors(read.errors);
      requestAnimationFrame(() => form.current?.querySelector<HTMLElement>('[aria-invalid]')?.focus());
      return;
    }
    const text = JSON.stringify(read.input);
    // A piece that failed on a bad line and is sent again is added once.
    const wish = failed.current.get(text) ?? crypto.randomUUID();
    failed.current.delete(text);
    // The field is free at once: who weighs a stack types the next mass before the answer is there.
    setDraft(nextLike(draft));
    mass.current?.focus();
    // One after another, so that the numbers follow the stack.
    queue.current = queue.current.then(() =>
      mutation.mutateAsync({ input: read.input, wish }).then(setAdded, (error: unknown) => {
        failed.current.set(text, wish);
        refuse(error, draft);
      }),
    );
  };

  /** What was refused comes back, unless something else was typed meanwhile; then it is told. */
  const refuse = (error: unknown, sent: PieceDraft) => {
    const { fields, root } = refusalOf(error, FIELDS);
    if (latest.current.mass !== null) {
      const told = [...fields.map(([, message]) => message), root ?? ''].join(' ').trim();
      return setErrors({ root: `The piece of ${units.format(sent.mass, 'mass')}: ${told}` });
    }
    setDraft(sent);
    setErrors({ ...Object.fromEntries(fields), ...(root === null ? {} : { root }) });
  };

  const density = densityWhileTyping(draft, draft.mass);
  return (
    <form ref={form} noValidate onSubmit={submit} aria-label="Put a piece on the rack">
      {errors.root && (
        <Notice tone="red" live word="Not added." className="mb-3">
          {errors.root}
        </Notice>
      )}
      <PieceFields draft={draft} errors={errors} onDraft={change} massRef={mass} />
      <div className="mt-1 flex flex-wrap items-end gap-x-4 gap-y-3">
        {draft.kind === 'sheet' && (
          <div className="w-44">
            <GrainSelect value={draft.grainCut} onValue={(cut) => change({ grainCut: cut })} />
          </div>
        )}
        <p className="min-h-row min-w-[min(13rem,100%)] flex-1 content-center" aria-live="polite">
          {density !== null && draft.material !== null ? (
            <strong className="text-heading font-semibold">
              {densityText(draft.material, density, units)}
            </strong>
          ) : (
            <span className="text-graphite">
              {added
                ? `Piece ${added.number} is on the rack. Type the next mass, or change the size.`
                : 'Sizes may be typed as 1/16 in or 1.5 mm. The density appears with the mass.'}
            </span>
          )}
        </p>
        {model && (
          <Button
            onClick={() => {
              change(nextLike(draftOf(model)));
              mass.current?.focus();
            }}
          >
            Like the last
            <span className="sr-only">
              : {KIND_WORDS[model.kind]}, {model.material.name}
            </span>
          </Button>
        )}
        <Button type="submit" variant="primary">
          Add
        </Button>
      </div>
    </form>
  );
}

const CUTS = [
  { value: '', label: 'Not looked at' },
  { value: 'A', label: 'A, bends easily' },
  { value: 'B', label: 'B, between' },
  { value: 'C', label: 'C, stiff across' },
];

interface GrainSelectProps {
  value: PieceDraft['grainCut'];
  onValue: (value: PieceDraft['grainCut']) => void;
}

export function GrainSelect({ value, onValue }: GrainSelectProps) {
  return (
    <Select
      label="Grain cut"
      keepRoom={false}
      options={CUTS}
      value={value ?? ''}
      onValue={(next) => onValue(grainCut.safeParse(next).data ?? null)}
    />
  );
}
