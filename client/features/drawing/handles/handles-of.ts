import type { Surface } from '#shared/core/plan.ts';
import { surfaceLine } from '#shared/core/stations.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import type { Handle } from './handle.ts';
import { panelHandles } from './panel-handles.ts';
import { partHandles } from './part-handles.ts';

/** What can be taken hold of on a surface laid flat: the picked part, or the planform while none is picked. */
export function handlesOf(surface: Surface, index: number, picked: string | null): Handle[] {
  const line = surfaceLine(surface);
  const part = surface.parts.find(({ id }) => picked === `${surface.key}/${id}`);
  if (!part) return picked === null ? panelHandles(surface, index, line) : [];
  const marks = [...ribNumbers(surface), ...line.panels.flatMap(({ start, end }) => [start, end])];
  return partHandles({ surface, index, line, marks }, part);
}
