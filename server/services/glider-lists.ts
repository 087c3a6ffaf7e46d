import { col, fn, Op, where, type Order } from 'sequelize';
import { z } from 'zod';
import type { ArchivedFilter, GliderDirection, GliderListDto, GliderOrder } from '#shared/schemas/glider.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { presentGliderSummary } from '#server/presenters/glider.ts';
import { decodeCursor, pageOf, type PageQuery } from './paging.ts';

type Key = 'changedAt' | 'nameKey' | 'mass';

interface BenchOrder {
  key: Key;
  column: string;
  usual: GliderDirection;
  value: z.ZodType<string | number>;
}

/** Every order has an index of its own, see the migration of the bench. */
const ORDERS: Record<GliderOrder, BenchOrder> = {
  changed: { key: 'changedAt', column: 'changed_at', usual: 'down', value: z.iso.datetime() },
  name: { key: 'nameKey', column: 'name_key', usual: 'up', value: z.string() },
  mass: { key: 'mass', column: 'mass_g', usual: 'up', value: z.number() },
};

export interface BenchQuery extends PageQuery {
  sort: GliderOrder;
  direction?: GliderDirection | undefined;
  archived: ArchivedFilter;
  search?: string | undefined;
}

/** What is behind a column of the asker's row of members, in the query below. */
const memberColumn = (name: string) => col(`GliderMember.${name}`);

/** Gliders that the asker has any role on. The asker's own rows of members are walked along one index. */
export async function listGliders(actor: UserDto, query: BenchQuery): Promise<GliderListDto> {
  const { key, column, usual, value } = ORDERS[query.sort];
  const direction = query.direction ?? usual;
  const after = decodeCursor(
    query.cursor,
    z.tuple([z.literal(`${query.sort} ${direction}`), value, z.uuid()]),
  );
  const [way, beyond] = direction === 'up' ? (['ASC', Op.gt] as const) : (['DESC', Op.lt] as const);
  const order: Order = [
    [key, way],
    ['gliderId', way],
  ];
  const found = await GliderMember.findAll({
    include: [
      {
        association: 'glider',
        attributes: { exclude: ['plan'] },
        required: true,
        include: [{ association: 'owner', attributes: ['name'], required: true }],
      },
    ],
    where: {
      [Op.and]: [
        { userId: actor.id, archived: query.archived === 'only' },
        ...(query.search
          ? [where(fn('strpos', memberColumn('name_key'), fn('sort_key', query.search)), Op.gt, 0)]
          : []),
        ...(after
          ? [
              where(
                fn('ROW', memberColumn(column), memberColumn('glider_id')),
                beyond,
                fn('ROW', after[1], after[2]),
              ),
            ]
          : []),
      ],
    },
    order,
    limit: query.limit + 1,
  });
  const { rows, nextCursor } = pageOf(found, query.limit, (row) => [
    `${query.sort} ${direction}`,
    row[key] instanceof Date ? row[key].toISOString() : row[key],
    row.gliderId,
  ]);
  return {
    gliders: rows.flatMap(({ glider, role }) =>
      glider ? [presentGliderSummary(glider, role, glider.owner?.name ?? '')] : [],
    ),
    nextCursor,
  };
}
