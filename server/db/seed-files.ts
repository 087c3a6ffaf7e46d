import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { LIMITS } from '#shared/schemas/limits.ts';
import { materialInput } from '#shared/schemas/material.ts';
import { planSchema, type PlanDto } from '#shared/schemas/plan.ts';
import { splitInput, useInput } from '#shared/schemas/rack.ts';
import { email } from '#shared/schemas/session.ts';
import { stockFields } from '#shared/schemas/stock-piece.ts';

/** A file of `data/` is missing or wrong; the message says which and where. */
export class SeedError extends Error {}

const key = z.string().min(1).max(LIMITS.key.max);

const seedMaterial = z.strictObject({ ...materialInput.shape, key }).omit({ shared: true });
const materialsFile = z.object({ materials: z.array(seedMaterial) });

const gliderFile = z.string().regex(/^[\w-]+\.json$/);

const peopleFile = z.object({
  people: z.array(
    z.strictObject({
      key,
      name: z.string().min(1).max(LIMITS.name.max),
      email,
      password: z.string().min(1).max(LIMITS.password.max),
      role: z.enum(['admin', 'user']),
    }),
  ),
  gliders: z.array(
    z.strictObject({
      file: gliderFile,
      owner: key,
      members: z.array(z.strictObject({ person: key, role: z.enum(['builder', 'pilot', 'reader']) })),
      sheets: z.array(z.strictObject({ note: z.string().max(LIMITS.note.max) })),
    }),
  ),
});

const rackFile = z.strictObject({
  /** key of a person */
  owner: key,
  pieces: z.array(
    z.strictObject({
      ...stockFields,
      /** key of a row of the materials */
      material: key,
      reservedFor: gliderFile.optional(),
      used: z.strictObject({ in: gliderFile, leftovers: useInput.shape.leftovers }).optional(),
      split: splitInput.optional(),
    }),
  ),
});

export type SeedMaterial = z.infer<typeof seedMaterial>;
export type People = z.infer<typeof peopleFile>;
export type DemoRack = z.infer<typeof rackFile>;

const DATA = new URL('../../data/', import.meta.url);

/** @throws SeedError */
async function readData<T>(path: string, schema: z.ZodType<T>): Promise<T> {
  const text = await readFile(new URL(path, DATA), 'utf8').catch(() => {
    throw new SeedError(`data/${path} cannot be read.`);
  });
  try {
    return schema.parse(JSON.parse(text));
  } catch (error) {
    const why = error instanceof z.ZodError ? z.prettifyError(error) : String(error);
    throw new SeedError(`data/${path} is wrong: ${why}`);
  }
}

export async function readSeedMaterials(): Promise<SeedMaterial[]> {
  return (await readData('materials.json', materialsFile)).materials;
}

export const readPeople = (): Promise<People> => readData('demo/people.json', peopleFile);

export const readDemoRack = (): Promise<DemoRack> => readData('demo/rack.json', rackFile);

export const readDemoPlan = (file: string): Promise<PlanDto> => readData(`demo/gliders/${file}`, planSchema);
