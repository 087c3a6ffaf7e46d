// @vitest-environment happy-dom
import { act } from 'react';
import { describe, expect, it } from 'vitest';
import { leave, type } from '#tests/client/lib/mount.tsx';
import { samplePlan as dunlin } from '#client/features/gliders/sample-plan.ts';
import { button, drawingDesk } from './desk.tsx';

const rowsOf = (element: HTMLElement) =>
  [...element.querySelectorAll<HTMLElement>('[data-line]')].map((row) => row.dataset['line']);
/** Longer than a wish for the focus waits, ms. */
const SETTLED = 80;
const settle = () => act(() => new Promise((done) => setTimeout(done, SETTLED)));

describe('the drawing', () => {
  it('lists the parts of the surface at hand and draws it, told in a sentence', async () => {
    const { element, press } = await drawingDesk(dunlin);
    expect(rowsOf(element)).toEqual(dunlin.surfaces[0]!.parts.map(({ id }) => `wing/${id}`));
    const drawings = [...element.querySelectorAll('svg[role="img"]')].map(
      (svg) => svg.querySelector('title')?.textContent,
    );
    expect(drawings).toHaveLength(2);
    expect(drawings[0]).toMatch(/^Wing, one half laid flat/);
    expect(drawings[1]).toMatch(/^Section of Wing/);
    await press('Items');
    expect(rowsOf(element)).toEqual(dunlin.items.map(({ id }) => `item/${id}`));
  });

  it('opens the form of the part that is picked, one at a time', async () => {
    const { element, press, input } = await drawingDesk(dunlin);
    await press(/^Spar, top/);
    expect(input('Name').value).toBe('Spar, top');
    await press(/^Leading edge/);
    expect(element.querySelectorAll('[data-form]')).toHaveLength(1);
    expect(input('Name').value).toBe('Leading edge');
    expect(button(element, /^Leading edge/).getAttribute('aria-expanded')).toBe('true');
  });

  it('weighs and draws a changed size at once', async () => {
    const { element, plan, press, input } = await drawingDesk(dunlin);
    await press(/^Spar, top/);
    const row = () => element.querySelector('[data-line="wing/spar-top"]')?.textContent;
    const before = row();
    await type(input('Width, at its inner end'), '9');
    expect(plan().surfaces[0]?.parts.find(({ id }) => id === 'spar-top')).toMatchObject({
      width: [9, expect.any(Number)],
    });
    expect(row()).not.toBe(before);
  });

  it('says what is wrong with a negative chord, keeps it as typed, and goes on drawing the last valid plan', async () => {
    const { element, plan, input } = await drawingDesk(dunlin);
    const drawn = () => element.querySelector('svg[role="img"]')?.innerHTML;
    const before = drawn();
    const chord = input('Panel 1, root chord');
    await type(chord, '-5');
    expect(plan().surfaces[0]?.panels[0]?.rootChord).toBe(-5);
    expect(chord.value).toBe('-5');
    expect(chord.getAttribute('aria-invalid')).toBe('true');
    expect(element.textContent).toContain('Must be more than 0 mm.');
    expect(element.textContent).toContain('Drawn is the last valid plan.');
    expect(drawn()).toBe(before);
  });

  it('keeps letters and an empty field out of the plan, and says so at the field', async () => {
    const { plan, input } = await drawingDesk(dunlin);
    const span = input('Panel 1, span');
    for (const text of ['wide', '']) {
      await type(span, text);
      await leave(span);
      expect(span.value).toBe(text);
      expect(span.getAttribute('aria-invalid')).toBe('true');
      expect(plan()).toEqual(dunlin);
    }
  });

  it('cannot be edited by a reader, but still be looked at', async () => {
    const { element, press, input } = await drawingDesk(dunlin, { canEdit: false });
    await press(/^Spar, top/);
    expect(input('Name').readOnly).toBe(true);
    expect([...element.querySelectorAll('button')].map((b) => b.textContent)).not.toContain('Remove');
    expect(() => button(element, 'Add a part')).toThrow('no button');
  });

  it('takes its surface along when that is renamed, letter by letter', async () => {
    const { plan, press, input, element } = await drawingDesk(dunlin);
    await press('Fin');
    await type(input('Name'), 'f');
    await type(input('Name'), 'rudder');
    expect(plan().surfaces[2]?.key).toBe('rudder');
    expect(button(element, 'Rudder').getAttribute('aria-current')).toBe('true');
  });
});

describe('the focus', () => {
  it('goes to the next row when one is removed, and to the row that an undo brings back', async () => {
    const { element, press } = await drawingDesk(dunlin);
    await press(/^Spar, top/);
    await press('Remove');
    await settle();
    expect(rowsOf(element)).not.toContain('wing/spar-top');
    expect(document.activeElement?.closest('[data-line]')?.getAttribute('data-line')).toBe(
      'wing/spar-bottom',
    );
    expect(element.textContent).toContain('“Spar, top” removed.');
    await press('Undo');
    await settle();
    expect(document.activeElement?.closest('[data-line]')?.getAttribute('data-line')).toBe('wing/spar-top');
    expect(element.textContent).not.toContain('removed.');
  });

  it('goes to the name of a copy', async () => {
    const { press } = await drawingDesk(dunlin);
    await press(/^Spar, top/);
    await press('Copy');
    await settle();
    expect(document.activeElement).toBeInstanceOf(HTMLInputElement);
    expect((document.activeElement as HTMLInputElement).value).toBe('Spar, top 2');
  });

  it('stays on the arrow that moves a row', async () => {
    const { element, press, plan } = await drawingDesk(dunlin);
    await press(/^Spar, top/);
    const down = button(element, 'Move Spar, top down');
    down.focus();
    await press('Move Spar, top down');
    await settle();
    expect(document.activeElement).toBe(button(element, 'Move Spar, top down'));
    const ids = plan().surfaces[0]!.parts.map(({ id }) => id);
    expect(ids.indexOf('spar-top')).toBe(ids.indexOf('spar-bottom') + 1);
  });
});
