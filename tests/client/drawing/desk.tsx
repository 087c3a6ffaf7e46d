import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, useMemo, useState, type ReactNode } from 'react';
import { DrawingPlace } from '#client/features/drawing/drawing-place.tsx';
import { checkPlan } from '#client/features/gliders/plan-check.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { estimate } from '#shared/core/estimate.ts';
import type { Plan } from '#shared/core/plan.ts';
import { mount } from '#tests/client/lib/mount.tsx';

interface Desk {
  element: HTMLElement;
  plan: () => Plan;
  /** presses a button, by its name or a piece of its text */
  press: (name: string | RegExp) => Promise<void>;
  input: (label: string) => HTMLInputElement;
}

/** The drawing on a desk that checks, estimates and undoes as the real one does, without a server. */
export async function drawingDesk(first: Plan, options: { canEdit?: boolean } = {}): Promise<Desk> {
  let latest = first;
  function Shell(): ReactNode {
    const [past, setPast] = useState<Plan[]>([first]);
    const [selected, select] = useState<string | null>(null);
    const plan = past.at(-1) ?? first;
    latest = plan;
    const valid = past.findLast((p) => checkPlan(p).ok) ?? first;
    const result = useMemo(() => estimate(valid), [valid]);
    const workspace: Workspace = {
      plan,
      result,
      edit: (recipe) => setPast((all) => [...all, recipe(all.at(-1) ?? first)]),
      canEdit: options.canEdit ?? true,
      kind: 'sample',
      saveState: 'saved',
      issues: checkPlan(plan).issues,
      selected,
      select,
      undo: () => setPast((all) => (all.length > 1 ? all.slice(0, -1) : all)),
      redo: () => undefined,
      canUndo: past.length > 1,
      canRedo: false,
    };
    return <DrawingPlace workspace={workspace} />;
  }
  const client = new QueryClient();
  const { element } = await mount(
    <QueryClientProvider client={client}>
      <Shell />
    </QueryClientProvider>,
  );
  // The delivered table is fetched like a file of the page.
  await act(() => client.refetchQueries());
  return {
    element,
    plan: () => latest,
    press: (name) => act(async () => button(element, name).click()),
    input: (label) => field(element, label),
  };
}

const nameOf = (b: HTMLElement) => b.getAttribute('aria-label') ?? b.textContent;

/** A button by its whole name, or the first whose name fits a pattern. */
export function button(root: ParentNode, name: string | RegExp): HTMLButtonElement {
  const found = [...root.querySelectorAll('button')].find((b) =>
    typeof name === 'string' ? nameOf(b) === name : name.test(nameOf(b)),
  );
  if (!found) throw new Error(`no button ${String(name)}`);
  return found;
}

export function field(root: ParentNode, label: string): HTMLInputElement {
  const found = [...root.querySelectorAll('label')].find((l) => l.textContent === label);
  const input = found && root.querySelector(`#${CSS.escape(found.htmlFor)}`);
  if (!(input instanceof HTMLInputElement)) throw new Error(`no field ${label}`);
  return input;
}
