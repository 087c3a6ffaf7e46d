import { randomUUID } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import { describe, expect, it } from 'vitest';
import { clubRole } from '#shared/schemas/club.ts';
import { gliderRole } from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { materialBasis, materialCategory } from '#shared/schemas/material.ts';
import { grainCut, stockKind, stockState } from '#shared/schemas/stock-piece.ts';
import { user as userSchema } from '#shared/schemas/session.ts';
import { failureOf } from '#server/db/failure.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Material } from '#server/models/material.ts';
import { User } from '#server/models/user.ts';
import { useApp } from '../support/app.ts';
import { makeUser } from '../support/people.ts';
import { makeGlider, makeMaterial, MATERIAL, planWith } from '../support/rows.ts';
import { makeSheet } from '../support/sheets.ts';
import { makePiece } from '../support/stock.ts';

const app = useApp();

const RESTRICTED = '23001';
const FOREIGN_KEY = '23503';
const CHECK = '23514';

async function refusal(work: () => Promise<unknown>) {
  const error: unknown = await work().then(
    () => undefined,
    (thrown: unknown) => thrown,
  );
  return failureOf(error);
}

const run =
  (sql: string, replacements: unknown[] = []) =>
  () =>
    app.sequelize.query(sql, { replacements });

async function definitionOf(constraint: string): Promise<string> {
  const [row] = await app.sequelize.query<{ definition: string }>(
    'SELECT pg_get_constraintdef(oid) AS definition FROM pg_constraint WHERE conname = ?',
    { type: QueryTypes.SELECT, replacements: [constraint] },
  );
  if (!row) throw new Error(`There is no constraint ${constraint}.`);
  return row.definition;
}

describe('the numbers typed into CHECK constraints', () => {
  it.each([
    ['users_name_length', LIMITS.name.max],
    ['users_email_length', LIMITS.email.max],
    ['materials_key_length', LIMITS.key.max],
    ['materials_name_length', LIMITS.name.max],
    ['materials_density', LIMITS.density.max],
    ['materials_areal', LIMITS.areal.max],
    ['materials_spread', LIMITS.spread.max],
    ['materials_cv', LIMITS.cv.max],
    ['materials_modulus', LIMITS.modulus.max],
    ['materials_strength', LIMITS.strength.max],
    ['materials_form_length', LIMITS.note.max],
    ['materials_source_length', LIMITS.note.max],
    ['gliders_name_length', LIMITS.name.max],
    ['sheets_note_length', LIMITS.note.max],
    ['stock_pieces_length', LIMITS.lengthMm.max],
    ['stock_pieces_width', LIMITS.lengthMm.max],
    ['stock_pieces_thickness', LIMITS.lengthMm.max],
    ['stock_pieces_wall', LIMITS.lengthMm.max],
    ['stock_pieces_mass', LIMITS.massG.max],
    ['stock_pieces_resolution', LIMITS.massG.max],
    ['stock_pieces_material_key', LIMITS.key.max],
    ['stock_pieces_material_name', LIMITS.name.max],
    ['stock_pieces_grade_length', LIMITS.name.max],
    ['stock_pieces_note_length', LIMITS.note.max],
    ['rack_imports_count', LIMITS.rackImport.max],
    ['clubs_name_length', LIMITS.name.max],
    ['clubs_place_length', LIMITS.name.max],
    ['class_editions_name_length', LIMITS.name.max],
    ['class_editions_note_length', LIMITS.note.max],
  ])('%s are the limits of the schema', async (constraint, limit) => {
    const numbers = [...(await definitionOf(constraint)).matchAll(/\d+(?:\.\d+)?/g)].map(Number);
    expect(Math.max(...numbers)).toBe(limit);
  });

  it.each([
    ['users_role', userSchema.shape.role.options],
    ['materials_category', materialCategory.options],
    ['materials_basis', materialBasis.options],
    ['glider_members_role', gliderRole.options],
    ['club_members_role', clubRole.options],
    ['club_invitations_role', clubRole.options],
    ['stock_pieces_kind', stockKind.options],
    ['stock_pieces_material_category', materialCategory.options],
    ['stock_pieces_grain_cut', grainCut.options],
    ['stock_pieces_state', stockState.options],
  ])('%s lists the words of the schema', async (constraint, words) => {
    const listed = [...(await definitionOf(constraint)).matchAll(/'([^']+)'/g)].map(([, word]) => word);
    expect(new Set(listed)).toEqual(new Set(words));
  });
});

describe('the database by itself', () => {
  it.each([
    { density: -1 },
    { density: Number.NaN },
    { density: 25_001 },
    { density: null, areal: null, spread: null },
    { cv: 1.5 },
    { name: '' },
  ])('refuses a material with %j', async (wrong) => {
    const { shared: _, ...fields } = MATERIAL;
    const work = () => Material.create({ ...fields, key: randomUUID(), ...wrong });
    expect((await refusal(work)).sqlState).toBe(CHECK);
  });

  it('refuses a password that is not hashed and an address with capitals', async () => {
    const { passwordHash } = await makeUser();
    const make = (changes: object) => () =>
      User.create({ name: 'X', email: `${randomUUID()}@x.example`, passwordHash, ...changes });
    expect(await refusal(make({ passwordHash: 'plain words' }))).toEqual({
      sqlState: CHECK,
      constraint: 'users_password_hashed',
    });
    expect((await refusal(make({ email: 'X@x.example' }))).constraint).toBe('users_email_lower');
  });

  it('never loses a material in use, also by SQL', async () => {
    const material = await makeMaterial();
    await makeGlider({ plan: planWith(material) });
    const failure = await refusal(run('DELETE FROM materials WHERE id = ?', [material.id]));
    expect(failure).toEqual({ sqlState: FOREIGN_KEY, constraint: 'glider_materials_material' });
    expect(await Material.count({ where: { id: material.id } })).toBe(1);
  });

  it('never loses a user who owns, saved or is a member of something', async () => {
    const owner = await makeUser();
    await makeGlider({ owner });
    expect((await refusal(run('DELETE FROM users WHERE id = ?', [owner.id]))).sqlState).toBe(FOREIGN_KEY);
  });

  it('knows one owner of a glider, who is the owner by every table', async () => {
    const [glider, user] = [await makeGlider(), await makeUser()];
    const join = (changes: object) => () =>
      GliderMember.create({
        ownerId: glider.ownerId,
        gliderId: glider.id,
        userId: user.id,
        role: 'reader',
        ...changes,
      });
    expect((await refusal(join({ role: 'owner' }))).constraint).toBe('glider_members_owner');
    expect((await refusal(join({ ownerId: user.id }))).constraint).toMatch(/^glider_members_(glider|owner)$/);
    await join({})();
  });
});

describe('a sheet and a save in the database', () => {
  it.each(['sheets', 'glider_saves'])(
    'of %s can be neither changed nor removed, also by SQL',
    async (table) => {
      const owner = await makeUser();
      const glider = await makeGlider({ owner });
      await makeSheet(glider, owner);
      const of = [glider.id];
      for (const statement of [
        `UPDATE ${table} SET mass_g = 1 WHERE glider_id = ?`,
        `UPDATE ${table} SET plan = '{}' WHERE glider_id = ?`,
        `DELETE FROM ${table} WHERE glider_id = ?`,
      ]) {
        expect((await refusal(run(statement, of))).sqlState).toBe(RESTRICTED);
      }
      expect((await refusal(run(`TRUNCATE ${table} CASCADE`))).sqlState).toBe(RESTRICTED);
      const [rows] = await run(`SELECT mass_g FROM ${table} WHERE glider_id = ?`, of)();
      expect(rows).toEqual([{ mass_g: glider.mass }]);
    },
  );

  it('goes with its whole glider', async () => {
    const owner = await makeUser();
    const glider = await makeGlider({ owner });
    await makeSheet(glider, owner);
    await run('DELETE FROM gliders WHERE id = ?', [glider.id])();
    const [rows] = await run('SELECT FROM sheets WHERE glider_id = ?', [glider.id])();
    expect(rows).toEqual([]);
  });

  it('has a number of its own', async () => {
    const owner = await makeUser();
    const glider = await makeGlider({ owner });
    const sheet = await makeSheet(glider, owner);
    const copy = run(
      `INSERT INTO sheets SELECT gen_random_uuid(), owner_id, glider_id, number, glider_name, note, plan, result,
         calculator, sha256, mass_g, percent_mac, wing_loading_g_dm2, saved_by, saved_by_name
       FROM sheets WHERE id = ?`,
      [sheet.id],
    );
    expect((await refusal(copy)).constraint).toBe('sheets_glider_id_number_key');
  });
});

describe('a stock piece', () => {
  it.each([
    ['held by no glider while reserved', "state = 'reserved'", 'stock_pieces_place'],
    ['of an unknown state', "state = 'lost'", 'stock_pieces_state'],
    [
      'with a density and no mass',
      'mass_g = NULL, resolution_g = NULL, weighed = false',
      'stock_pieces_dense',
    ],
    ['weighed without a mass', 'mass_g = NULL, density_kg_m3 = NULL', 'stock_pieces_weighed'],
    ['with a wall that is no tube', 'wall_mm = 1', 'stock_pieces_tube'],
    ['with a tube’s kind and no wall', "kind = 'tube'", 'stock_pieces_tube'],
    ['heavier than it may be', 'mass_g = 100001', 'stock_pieces_mass'],
  ])('is never %s', async (_, change, constraint) => {
    const { id } = await makePiece(await makeUser());
    const failure = await refusal(run(`UPDATE stock_pieces SET ${change} WHERE id = ?`, [id]));
    expect(failure).toEqual({ sqlState: CHECK, constraint });
  });

  it('has a number of its own', async () => {
    const owner = await makeUser();
    const [, { id }] = [await makePiece(owner), await makePiece(owner)];
    const failure = await refusal(run('UPDATE stock_pieces SET number = 1 WHERE id = ?', [id]));
    expect(failure.constraint).toBe('stock_pieces_user_id_number_key');
  });

  it('is cut from no piece of somebody else', async () => {
    const [mine, other] = [await makePiece(await makeUser()), await makePiece(await makeUser())];
    const failure = await refusal(
      run('UPDATE stock_pieces SET parent_id = ? WHERE id = ?', [other.id, mine.id]),
    );
    expect(failure).toEqual({ sqlState: FOREIGN_KEY, constraint: 'stock_pieces_parent' });
  });
});
