import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import type { BuildTermsDto, BuildTermsInput } from '#shared/schemas/weighing.ts';
import { builtQueries, saveTerms } from '#client/lib/built/queries.ts';

const inputOf = ({ version: _, updatedAt: __, updatedBy: ___, ...input }: BuildTermsDto): BuildTermsInput =>
  input;

/** What the finished model is to weigh. */
export function TargetField({
  gliderId,
  terms,
  canWeigh,
}: {
  gliderId: string;
  terms: BuildTermsDto;
  canWeigh: boolean;
}) {
  const client = useQueryClient();
  const [typed, setTyped] = useState<{ target: number | null } | null>(null);
  const { queryKey } = builtQueries.terms(gliderId);
  const save = useMutation({
    mutationFn: (target: number | null) => saveTerms(gliderId, { ...inputOf(terms), target }, terms.version),
    onSuccess: (saved) => {
      client.setQueryData(queryKey, saved);
      setTyped(null);
    },
    onError: () => void client.invalidateQueries({ queryKey }),
  });
  const target = typed ? typed.target : terms.target;
  return (
    <div className="flex flex-wrap items-end gap-x-3">
      <div className="w-44">
        <NumberField
          label="It is to weigh"
          quantity="mass"
          value={target}
          above={0}
          max={100_000}
          optional
          readOnly={!canWeigh}
          onChange={(value, problem) => {
            if (problem === null || problem === 'missing') setTyped({ target: value });
          }}
        />
      </div>
      {canWeigh && (
        <div className="pb-6">
          <Button
            disabled={typed === null || typed.target === terms.target}
            pending={save.isPending}
            onClick={() => save.mutate(target)}
          >
            Aim at that
          </Button>
        </div>
      )}
      {save.isError && (
        <p role="alert" className="pb-6 text-red">
          Not kept: {save.error.message} What you typed still stands; press again.
        </p>
      )}
    </div>
  );
}
