import { useQuery } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { TrialWood } from '#shared/core/wood-groups.ts';
import { rackList } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';

/** What a weighing on the workshop scale and a rule leave in doubt of a density (common practice, no source). */
const WEIGHED_CV = 0.02;
const NONE: readonly StockPieceDto[] = [];

/**
 * A weighed piece of the rack as a wood to try, under its number. Modulus and strength are those of the table's wood
 * of its kind, in proportion to density, as both are of balsa about its mean (an estimate; see the sources there).
 * Null for what is not of wood, or not weighed.
 */
export function woodOfPiece(piece: StockPieceDto, woods: readonly TrialWood[]): TrialWood | null {
  const { number, material, density } = piece;
  if (material.category !== 'wood' || density === null || !piece.weighed) return null;
  const of = woods.find(({ key }) => key === material.key)?.material;
  const scaled = (figure: number | undefined) =>
    figure === undefined || of?.density === undefined ? undefined : (figure * density) / of.density;
  const [modulus, strength] = [scaled(of?.modulus), scaled(of?.strength)];
  return {
    key: `rack-${number}`,
    material: {
      name: `No. ${number}, ${material.name}`,
      category: 'wood',
      density,
      cv: WEIGHED_CV,
      ...(modulus === undefined ? {} : { modulus }),
      ...(strength === undefined ? {} : { strength }),
      source: 'Weighed',
    },
  };
}

/** The reader's own weighed pieces that are still on the rack; none for the sample, or while they cannot be fetched. */
export function useRackWoods(kind: Workspace['kind'], woods: readonly TrialWood[]): TrialWood[] {
  const { data } = useQuery({
    queryKey: ['rack', 'woods'],
    queryFn: ({ signal }) => request('/rack?state=onRack&limit=100', rackList, { signal }),
    enabled: kind === 'saved',
    staleTime: 60_000,
  });
  return (data?.pieces ?? NONE).flatMap((piece) => woodOfPiece(piece, woods) ?? []);
}
