import { readFile } from 'node:fs/promises';
import { z } from 'zod';
import { classEditionInput, type ClassEditionInput } from '#shared/schemas/class-edition.ts';
import { clubRole } from '#shared/schemas/club.ts';
import { firstFlightInput } from '#shared/schemas/first-flight.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { materialInput } from '#shared/schemas/material.ts';
import { planSchema, type PlanDto } from '#shared/schemas/plan.ts';
import { splitInput, useInput } from '#shared/schemas/rack.ts';
import { email } from '#shared/schemas/session.ts';
import { buildStage, coveredLine } from '#shared/schemas/weighing.ts';
import { stockFields } from '#shared/schemas/stock-piece.ts';

/** A file of `data/` is missing or wrong; the message says which and where. */
export class SeedError extends Error {}

const key = z.string().min(1).max(LIMITS.key.max);

const seedMaterial = z.strictObject({ ...materialInput.shape, key }).omit({ shared: true });
const materialsFile = z.object({ materials: z.array(seedMaterial) });

const classesFile = z.strictObject({
  classes: z.array(
    z.strictObject({
      key: classEditionInput.shape.key,
      name: classEditionInput.shape.name,
      body: classEditionInput.shape.issuedBy,
      editions: z.array(classEditionInput.pick({ edition: true, note: true, limits: true })),
    }),
  ),
});

const gliderFile = z.string().regex(/^[\w-]+\.json$/);

const peopleFile = z.object({
  club: z.strictObject({
    name: z.string(),
    place: z.string(),
    invited: z.array(z.strictObject({ email, role: clubRole, by: key })),
  }),
  people: z.array(
    z.strictObject({
      key,
      name: z.string().min(1).max(LIMITS.name.max),
      email,
      password: z.string().min(1).max(LIMITS.password.max),
      role: z.enum(['admin', 'user']),
      /** what the person is in the club */
      inClub: clubRole,
    }),
  ),
  gliders: z.array(
    z.strictObject({
      file: gliderFile,
      owner: key,
      members: z.array(z.strictObject({ person: key, role: z.enum(['builder', 'pilot', 'reader']) })),
      /** whether its owner lets the club see it */
      shownToClub: z.boolean(),
      /** sign and edition of the class that it is built for */
      aim: z.strictObject({ key, edition: z.string() }).optional(),
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

const builtFile = z.strictObject({
  glider: gliderFile,
  /** g */
  target: z.number(),
  weighings: z.array(
    z.strictObject({
      title: key,
      stage: buildStage,
      covers: z.array(coveredLine).min(1),
      values: z.array(z.number()).min(1),
      resolution: z.number(),
      density: z.number().optional(),
      thickness: z.number().optional(),
      /** key of the person who weighed */
      by: key,
    }),
  ),
});

export type SeedMaterial = z.infer<typeof seedMaterial>;
export type People = z.infer<typeof peopleFile>;
export type DemoBuilt = z.infer<typeof builtFile>;
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

/** Every edition of every class, one by one. */
export async function readClassEditions(): Promise<ClassEditionInput[]> {
  const { classes } = await readData('classes.json', classesFile);
  return classes.flatMap(({ body: issuedBy, editions, ...named }) =>
    editions.map((edition) => ({ ...named, issuedBy, ...edition })),
  );
}

export const readPeople = (): Promise<People> => readData('demo/people.json', peopleFile);

export const readDemoRack = (): Promise<DemoRack> => readData('demo/rack.json', rackFile);

export const readDemoBuilt = (): Promise<DemoBuilt> => readData('demo/built.json', builtFile);

const flightFile = z.strictObject({
  glider: gliderFile,
  by: key,
  daysAgo: z.int().min(0),
  record: firstFlightInput.pick({
    method: true,
    ballast: true,
    checks: true,
    place: true,
    wind: true,
    glides: true,
    note: true,
  }),
});
export type DemoFlight = z.infer<typeof flightFile>;
export const readDemoFlight = (): Promise<DemoFlight> => readData('demo/flight.json', flightFile);

export const readDemoPlan = (file: string): Promise<PlanDto> => readData(`demo/gliders/${file}`, planSchema);
