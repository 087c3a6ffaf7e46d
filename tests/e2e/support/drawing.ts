import type { Browser } from 'playwright-core';
import { makeGlider, newBuilder, openDrawing, storedGlider, type Builder } from './desk.ts';

export type Own = Builder & { id: string };

/** Somebody new at the drawing of a glider of their own. */
export async function drawingOf(
  browser: Browser,
  name: string,
  options?: Parameters<typeof newBuilder>[2],
): Promise<Own> {
  const builder = await newBuilder(browser, name, options);
  const { id } = await makeGlider(builder);
  await openDrawing(builder.page, id);
  return { ...builder, id };
}

export const wingOf = async (own: Own) => {
  const [found] = (await storedGlider(own, own.id)).plan.surfaces;
  if (!found) throw new Error('no wing');
  return found;
};
export const partOf = async (own: Own, id: string) =>
  (await wingOf(own)).parts.find((part) => part.id === id);
