import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextArea, TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { ApiError } from '#client/lib/api.ts';
import { showRefusal } from '#client/lib/form-errors.ts';
import {
  materialInput,
  material as materialSchema,
  type MaterialDto,
  type MaterialInput,
} from '#shared/schemas/material.ts';
import { FORM_FIELDS, inputOf, NUMBER_FIELDS } from './material-input.ts';
import { useSaveMaterial } from './mutations.ts';
import { BASIS_OPTIONS, CATEGORY_OPTIONS } from './words.ts';

interface MaterialDialogProps {
  /** The row that is changed; null for a new one. */
  row: MaterialDto | null;
  /** Figures to begin a new row with. */
  from?: MaterialDto | undefined;
  isAdmin: boolean;
  onClose: () => void;
}

export function MaterialDialog({ row, from, isAdmin, onClose }: MaterialDialogProps) {
  const [target, setTarget] = useState<Pick<MaterialDto, 'id' | 'version'> | null>(row);
  const [theirs, setTheirs] = useState<MaterialDto | null>(null);
  const mutation = useSaveMaterial();
  const say = useToast();
  const { register, control, handleSubmit, setError, reset, formState } = useForm<MaterialInput>({
    resolver: zodResolver(materialInput),
    defaultValues: inputOf(row ?? from ?? null, row !== null),
  });
  const { errors } = formState;

  const submit = handleSubmit((input) =>
    mutation.mutateAsync({ row: target, input }).then(
      ({ name }) => {
        onClose();
        say(row ? `${name} was saved.` : `${name} is in the table.`);
      },
      (error: unknown) => {
        const current = currentOf(error);
        if (current) setTheirs(current);
        else showRefusal<MaterialInput>(error, FORM_FIELDS, setError);
      },
    ),
  );
  const { ref: nameRef, ...name } = register('name');
  const { ref: categoryRef, ...category } = register('category');
  const { ref: formRef, ...form } = register('form');
  const { ref: sourceRef, ...source } = register('source');
  const { ref: basisRef, ...basis } = register('basis');
  const { ref: sharedRef, ...shared } = register('shared');

  return (
    <Dialog
      open
      wide
      onOpenChange={(open) => !open && onClose()}
      title={row ? `Edit ${row.name}` : 'New material'}
      description={
        row && row.usedBy > 0
          ? 'Plans keep the figures that they were saved with; a plan takes the new ones when the material is picked again.'
          : undefined
      }
    >
      <form noValidate onSubmit={(event) => void submit(event)}>
        {errors.root?.message && (
          <Notice tone="red" live className="mb-3">
            {errors.root.message}
          </Notice>
        )}
        {theirs && (
          <Notice
            tone="ochre"
            live
            word="Changed meanwhile."
            className="mb-3"
            actions={
              <>
                <Button
                  onClick={() => {
                    setTarget(theirs);
                    setTheirs(null);
                  }}
                >
                  Keep mine
                </Button>
                <Button
                  onClick={() => {
                    reset(inputOf(theirs, true));
                    setTarget(theirs);
                    setTheirs(null);
                  }}
                >
                  Take theirs
                </Button>
              </>
            }
          >
            Somebody else saved this material while you were editing. Yours is not saved yet.
          </Notice>
        )}
        <div className="grid gap-x-6 gap-y-1.5 sm:grid-cols-[2fr_1fr]">
          <TextField {...name} inputRef={nameRef} label="Name" error={errors.name?.message} />
          <Select
            {...category}
            selectRef={categoryRef}
            label="Kind"
            options={CATEGORY_OPTIONS}
            error={errors.category?.message}
          />
        </div>
        <div className="mt-1.5 grid gap-x-6 gap-y-1.5 sm:grid-cols-3">
          {NUMBER_FIELDS.map(({ id, label, quantity, required, hint }) => (
            <Controller
              key={id}
              name={id}
              control={control}
              render={({ field, fieldState }) => (
                <NumberField
                  label={label}
                  quantity={quantity}
                  hint={hint}
                  optional={!required}
                  value={field.value}
                  // A text that is no number must not pass as an empty field.
                  onChange={(value, problem) =>
                    field.onChange(problem === null || problem === 'missing' ? value : NaN)
                  }
                  error={fieldState.error?.message}
                  inputRef={field.ref}
                />
              )}
            />
          ))}
        </div>
        <TextArea
          {...form}
          rows={2}
          inputRef={formRef}
          label="Form, cut, thickness"
          error={errors.form?.message}
        />
        <div className="mt-1.5 grid gap-x-6 sm:grid-cols-[1fr_13rem]">
          <TextArea
            {...source}
            rows={2}
            inputRef={sourceRef}
            label="Source of the figures"
            error={errors.source?.message}
          />
          <Select
            {...basis}
            selectRef={basisRef}
            label="How sure"
            options={BASIS_OPTIONS}
            error={errors.basis?.message}
          />
        </div>
        {isAdmin && (
          <Checkbox
            {...shared}
            inputRef={sharedRef}
            disabled={row?.shared ?? false}
            label="In everybody’s table"
            hint={errors.shared?.message}
          />
        )}
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button
            type="submit"
            variant="primary"
            pending={formState.isSubmitting}
            pendingText="Saving …"
            disabled={theirs !== null}
          >
            {row ? 'Save' : 'Add'}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

function currentOf(error: unknown): MaterialDto | null {
  if (!(error instanceof ApiError) || error.status !== 412) return null;
  const parsed = materialSchema.safeParse(error.problem['current']);
  return parsed.success ? parsed.data : null;
}
