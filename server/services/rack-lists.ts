import { col, fn, Op, where, type WhereOptions } from 'sequelize';
import { z } from 'zod';
import type { RackListDto, RackOrder, RackState } from '#shared/schemas/rack.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import type { StockKind, StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { StockPiece } from '#server/models/stock-piece.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';
import { presentPieces } from './stock-access.ts';

type Direction = 'asc' | 'desc';

export interface RackQuery extends PageQuery {
  order: RackOrder;
  direction: Direction;
  state: RackState;
  kind?: StockKind | undefined;
  search?: string | undefined;
}

const column = (name: string) => col(`StockPiece.${name}`);

/** What has no mass is the last in either direction. */
const last = (direction: Direction) => (direction === 'asc' ? 'Infinity' : '-Infinity');
const orLast = (name: string, direction: Direction) => fn('coalesce', column(name), last(direction));

type Place = string | number;

interface Order {
  key: (direction: Direction) => ReturnType<typeof fn> | ReturnType<typeof col>;
  place: (row: StockPiece, direction: Direction) => Place;
}

/** Every order has an index of its own, two where a figure may be missing; see the migration of the rack. */
const ORDERS: Record<Exclude<RackOrder, 'number'>, Order> = {
  material: {
    key: () => fn('sort_key', column('material_name')),
    // The database alone knows its key of a name, so the place is the name.
    place: (row) => row.materialName,
  },
  density: {
    key: (direction) => orLast('density_kg_m3', direction),
    place: (row, direction) => row.density ?? last(direction),
  },
  mass: {
    key: (direction) => orLast('mass_g', direction),
    place: (row, direction) => row.mass ?? last(direction),
  },
  length: { key: () => column('length_mm'), place: (row) => row.length },
  thickness: { key: () => column('thickness_mm'), place: (row) => row.thickness },
};

const cursorOf = ({ order, direction }: RackQuery) =>
  z.tuple([
    z.literal(`${order} ${direction}`),
    order === 'material' ? z.string() : z.union([z.number(), z.literal(last(direction))]),
    z.int32(),
  ]);

/** Pieces of the asker's rack, walked along one index. */
export async function listRack(actor: UserDto, query: RackQuery): Promise<RackListDto> {
  const { order, direction, state, kind, search, limit } = query;
  const after = decodeCursor<[string, Place, number]>(query.cursor, cursorOf(query));
  const [way, beyond] = direction === 'asc' ? (['ASC', Op.gt] as const) : (['DESC', Op.lt] as const);
  const key = order === 'number' ? null : ORDERS[order].key(direction);
  const found = await StockPiece.findAll({
    where: {
      [Op.and]: [
        { userId: actor.id },
        ...standing(state),
        ...(kind ? [{ kind }] : []),
        ...(search ? [matching(search)] : []),
        ...(after ? [beyondPlace(key, order, beyond, after)] : []),
      ],
    },
    order: [...(key ? [[key, way] as [typeof key, string]] : []), ['number', way]],
    limit: limit + 1,
  });
  const { rows, nextCursor } = pageOf(found, limit, (row) => [
    `${order} ${direction}`,
    order === 'number' ? row.number : ORDERS[order].place(row, direction),
    row.number,
  ]);
  return { pieces: await presentPieces(actor.id, rows), nextCursor };
}

/** Every index of the rack tells first whether a piece is still there. */
function standing(state: RackState): WhereOptions[] {
  const onRack = state === 'onRack' || state === 'free' || state === 'reserved';
  return [where(column('on_rack'), onRack), ...(state === 'onRack' ? [] : [{ state }])];
}

/** The pieces of the asker's rack in one list, by number: there are at most `LIMITS.rack.max`. */
export async function listForExport(actor: UserDto, state: RackState): Promise<StockPieceDto[]> {
  const rows = await StockPiece.findAll({
    where: { [Op.and]: [{ userId: actor.id }, ...standing(state)] },
    order: [['number', 'ASC']],
  });
  return presentPieces(actor.id, rows);
}

function beyondPlace(
  key: ReturnType<typeof fn> | ReturnType<typeof col> | null,
  order: RackOrder,
  beyond: typeof Op.gt | typeof Op.lt,
  [, place, number]: [string, Place, number],
): WhereOptions {
  if (key === null) return { number: { [beyond]: number } };
  const value = order === 'material' ? fn('sort_key', String(place)) : place;
  return where(fn('ROW', key, column('number')), beyond, fn('ROW', value, number));
}

/** Part of the material’s name, the grade or the note, whatever its case and accents; or the number on the label. */
function matching(search: string): WhereOptions {
  const text = fn('sort_key', fn('concat_ws', ' ', column('material_name'), column('grade'), column('note')));
  const number = /^#?(\d{1,9})$/.exec(search)?.[1];
  const contains = where(fn('strpos', text, fn('sort_key', search)), Op.gt, 0);
  return { [Op.or]: [contains, ...(number === undefined ? [] : [{ number: Number(number) }])] };
}
