import { readingOf } from '#shared/core/built/reading.ts';
import type { BuildTermsDto, WeighingDto } from '#shared/schemas/weighing.ts';
import type { BuildTerms } from '#server/models/build-terms.ts';
import type { Weighing } from '#server/models/weighing.ts';

export function presentWeighing(row: Weighing, correctedBy: string | null): WeighingDto {
  const reading = row.body.withdraws ? null : readingOf(row.body);
  return {
    ...row.body,
    id: row.id,
    number: row.number,
    mass: reading?.mass ?? null,
    u: reading?.u ?? null,
    weighedBy: row.weighedByName,
    receivedAt: row.receivedAt.toISOString(),
    correctedBy,
  };
}

const NONE: BuildTermsDto = {
  target: null,
  least: null,
  most: null,
  pieces: [],
  ballastAt: null,
  ballastRoom: null,
  version: 1,
  updatedAt: null,
  updatedBy: null,
};

export function presentBuildTerms(row: BuildTerms | null): BuildTermsDto {
  if (!row) return NONE;
  const { version, updatedAt, editor } = row;
  return { ...row.body, version, updatedAt: updatedAt.toISOString(), updatedBy: editor?.name ?? null };
}
