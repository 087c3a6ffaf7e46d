// @vitest-environment happy-dom
import { describe, expect, it, vi } from 'vitest';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { ChosenUnitsContext } from '#client/lib/chosen-units.ts';
import type { ParseProblem } from '#shared/units/scan.ts';
import { leave, mount, onlyInput, press, type } from '#tests/client/lib/mount.tsx';

type Change = (value: number | null, problem: ParseProblem | null) => void;

async function field(value: number | null, onChange: Change = () => undefined) {
  const node = (now: number | null) => (
    <NumberField label="Width" quantity="length" value={now} above={0} onChange={onChange} />
  );
  const mounted = await mount(node(value));
  return {
    ...mounted,
    input: onlyInput(mounted.element),
    set: (now: number | null) => mounted.show(node(now)),
  };
}

describe('number field', () => {
  it('gives on 1/16 in as 1.5875 mm (25.4 / 16, NIST SP 811) and keeps the text as typed', async () => {
    const onChange = vi.fn<Change>();
    const { input, set } = await field(3, onChange);
    await type(input, '1/16 in');
    expect(onChange).toHaveBeenLastCalledWith(1.5875, null);
    await set(1.5875);
    expect(input.value).toBe('1/16 in');
  });

  it('takes a sum, keeps it as typed and says what it comes to', async () => {
    const onChange = vi.fn<Change>();
    const { element, input, set } = await field(3, onChange);
    await type(input, '12+3.5');
    await set(15.5);
    expect(onChange).toHaveBeenLastCalledWith(15.5, null);
    expect(input.value).toBe('12+3.5');
    expect(element.textContent).toContain('= 15.5\u202fmm');
  });

  it('works in the reader’s inches, with the mm beside them', async () => {
    const onChange = vi.fn<Change>();
    const node = (now: number) => (
      <ChosenUnitsContext value={{ length: 'in' }}>
        <NumberField label="Width" quantity="length" value={now} onChange={onChange} />
      </ChosenUnitsContext>
    );
    const { element, show } = await mount(node(6.35));
    const input = onlyInput(element);
    expect(input.value).toBe('1/4');
    await type(input, '3/16');
    expect(onChange).toHaveBeenLastCalledWith(expect.closeTo(4.7625, 9), null);
    await show(node(4.7625));
    expect(element.textContent).toContain('in · 4.76\u202fmm');
  });

  it('does not re-format 2,50 under the cursor', async () => {
    const { input, set } = await field(3);
    await type(input, '2,50');
    await set(2.5);
    expect(input.value).toBe('2,50');
  });

  it('calls an empty field missing, not 0', async () => {
    const onChange = vi.fn<Change>();
    const { input } = await field(3, onChange);
    await type(input, '');
    expect(onChange).toHaveBeenLastCalledWith(null, 'missing');
    expect(input.value).toBe('');
  });

  it('says what is wrong once the field is left, and ties it to the field', async () => {
    const { element, input } = await field(3);
    await type(input, '12..5');
    expect(input.getAttribute('aria-invalid')).toBeNull();
    await leave(input);
    expect(input.getAttribute('aria-invalid')).toBe('true');
    const told = input.getAttribute('aria-describedby') ?? '';
    expect(element.querySelector(`#${CSS.escape(told)}`)?.textContent).toContain('Comma or point');
  });

  it('hands a negative width on and says at once that it is refused', async () => {
    const onChange = vi.fn<Change>();
    const { element, input, set } = await field(3, onChange);
    await type(input, '-3');
    await set(-3);
    expect(onChange).toHaveBeenLastCalledWith(-3, null);
    expect(element.textContent).toContain('Must be more than 0 mm.');
  });

  it('follows a value that was changed by something else, such as an undo', async () => {
    const { input, set } = await field(3);
    await type(input, '5');
    await set(5);
    await set(3);
    expect(input.value).toBe('3');
  });

  it('steps with the arrow keys, tenfold with shift', async () => {
    const onChange = vi.fn<Change>();
    const { input, set } = await field(20, onChange);
    await press(input, 'ArrowUp');
    expect(onChange).toHaveBeenLastCalledWith(20.5, null);
    await set(20.5);
    await press(input, 'ArrowDown', { shiftKey: true });
    expect(onChange).toHaveBeenLastCalledWith(15.5, null);
  });
});
