import { describe, expect, it } from 'vitest';
import { rackList, rackOrder, type RackOrder } from '#shared/schemas/rack.ts';
import type { StockPieceDto } from '#shared/schemas/stock-piece.ts';
import { useApp } from '../support/app.ts';
import { makePerson, type Person } from '../support/people.ts';
import { refusedFields } from '../support/problems.ts';
import { fillRack, makePiece, STICK } from '../support/stock.ts';

const app = useApp();

const page = async ({ agent }: Person, query: object) =>
  rackList.parse((await agent.get('/api/rack').query(query).expect(200)).body);

/** The whole list, over pages of this size. */
async function walk(person: Person, query: object, limit: number): Promise<StockPieceDto[]> {
  const pieces: StockPieceDto[] = [];
  for (let cursor: string | null | undefined; cursor !== null;) {
    const found = await page(person, { ...query, limit: String(limit), ...(cursor && { cursor }) });
    pieces.push(...found.pieces);
    cursor = found.nextCursor;
  }
  return pieces;
}

const FIGURES: Record<RackOrder, (piece: StockPieceDto) => string | number | null> = {
  number: ({ number }) => number,
  material: ({ material }) => material.name.toLowerCase(),
  density: ({ density }) => density,
  mass: ({ mass }) => mass,
  length: ({ length }) => length,
  thickness: ({ thickness }) => thickness,
};

/** As the list should be: by the figure, then by number, what has none last. */
function ordered(pieces: StockPieceDto[], order: RackOrder, direction: 'asc' | 'desc'): number[] {
  const sign = direction === 'asc' ? 1 : -1;
  const figure = FIGURES[order];
  return pieces
    .toSorted((a, b) => {
      const [left, right] = [figure(a), figure(b)];
      if (left === right) return sign * (a.number - b.number);
      if (left === null) return 1;
      if (right === null) return -1;
      return left < right ? -sign : sign;
    })
    .map(({ number }) => number);
}

describe('GET /api/rack', () => {
  it('lists the asker’s pieces alone, those on the rack, by number', async () => {
    const [person, other] = [await makePerson(app), await makePerson(app)];
    await makePiece(other.user);
    const spent = await makePiece(person.user);
    const made = [await makePiece(person.user), await makePiece(person.user, STICK)];
    await person.agent.post(`/api/rack/${spent.id}/use`).send({ gliderId: null, leftovers: [] }).expect(200);
    const { pieces, nextCursor } = await page(person, {});
    expect(pieces).toEqual(made);
    expect(nextCursor).toBeNull();
  });

  it.each(
    rackOrder.options.flatMap((order) => (['asc', 'desc'] as const).map((way) => [order, way] as const)),
  )(
    'in the order of %s, %s, gives every piece once over pages, what was not weighed last',
    async (order, direction) => {
      const person = await makePerson(app);
      await fillRack(app, person.user, 120);
      const all = await walk(person, {}, 100);
      const walked = await walk(person, { order, direction }, 17);
      expect(walked.map(({ number }) => number)).toEqual(ordered(all, order, direction));
    },
  );

  it('keeps to states and kinds', async () => {
    const person = await makePerson(app);
    await fillRack(app, person.user, 60);
    const used = await walk(person, { state: 'used' }, 7);
    expect(used.map(({ number }) => number)).toEqual(Array.from({ length: 12 }, (_, i) => 5 * i + 4));
    const sticks = await walk(person, { kind: 'stick', state: 'free', order: 'mass' }, 7);
    expect(sticks.length).toBeGreaterThan(10);
    expect(new Set(sticks.map(({ kind, state }) => `${kind} ${state}`))).toEqual(new Set(['stick free']));
    expect(await walk(person, { state: 'reserved' }, 7)).toEqual([]);
  });

  it('finds parts of the material, the grade and the note, whatever case and accents, and the number', async () => {
    const person = await makePerson(app);
    const [kuhl] = [
      await makePiece(person.user, { material: { key: null, name: 'Kühlbalsa', category: 'wood' } }),
      await makePiece(person.user, { grade: 'Contest, 100 % flecked' }),
      await makePiece(person.user, { note: 'from the ATTIC' }),
    ];
    const found = async (search: string) =>
      (await page(person, { search })).pieces.map(({ number }) => number);
    expect(await found('KUHL')).toEqual([kuhl.number]);
    expect(await found('100 %')).toEqual([2]);
    expect(await found('attic')).toEqual([3]);
    expect(await found('3')).toEqual([3]);
    expect(await found('#2')).toEqual([2]);
    expect(await found("'; DROP TABLE stock_pieces; --")).toEqual([]);
    expect(await found('')).toEqual([1, 2, 3]);
  });

  it('refuses orders, states and cursors that are not its own', async () => {
    const person = await makePerson(app);
    await fillRack(app, person.user, 10);
    const wrong = { order: 'colour', direction: 'up', state: 'lost', kind: 'board', limit: '0', page: '2' };
    expect(refusedFields(await person.agent.get('/api/rack').query(wrong))).toEqual(
      Object.keys(wrong)
        .map((field) => `#/${field}`)
        .toSorted((a, b) => (a < b ? -1 : 1)),
    );
    const { nextCursor } = await page(person, { order: 'mass', limit: '2' });
    for (const query of [
      { order: 'length', cursor: nextCursor },
      { order: 'mass', direction: 'desc', cursor: nextCursor },
      { cursor: 'AAAA' },
    ]) {
      expect(refusedFields(await person.agent.get('/api/rack').query(query))).toEqual(['#/cursor']);
    }
  });
});
