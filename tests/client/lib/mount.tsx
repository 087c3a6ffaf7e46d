import { act, type ReactNode } from 'react';
import { createRoot } from 'react-dom/client';

Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });

export interface Mounted {
  element: HTMLElement;
  show: (node: ReactNode) => Promise<void>;
  unmount: () => Promise<void>;
}

/** Shows a node in a fresh page and settles what it starts. */
export async function mount(node: ReactNode): Promise<Mounted> {
  const element = document.createElement('div');
  document.body.replaceChildren(element);
  const root = createRoot(element);
  const show = (next: ReactNode) => act(async () => root.render(next));
  await show(node);
  return { element, show, unmount: () => act(async () => root.unmount()) };
}

/** Types into a field as a person does: past the setter that React puts on it, then the event that it listens to. */
export async function type(input: HTMLInputElement, text: string): Promise<void> {
  await act(async () => {
    Reflect.set(HTMLInputElement.prototype, 'value', text, input);
    input.dispatchEvent(new Event('input', { bubbles: true }));
  });
}

export async function press(target: HTMLElement, key: string, init: KeyboardEventInit = {}): Promise<void> {
  await act(async () => {
    target.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...init }));
  });
}

export async function leave(target: HTMLElement): Promise<void> {
  await act(async () => {
    target.dispatchEvent(new FocusEvent('focusout', { bubbles: true }));
  });
}

/** The only element of that kind; a test that finds none or two is wrong about the page. */
export function only(root: ParentNode, selector: string): HTMLElement {
  const found = root.querySelectorAll<HTMLElement>(selector);
  const [first] = found;
  if (!first || found.length > 1) throw new Error(`${found.length} elements fit ${selector}`);
  return first;
}

export function onlyInput(root: ParentNode, selector = 'input'): HTMLInputElement {
  const element = only(root, selector);
  if (!(element instanceof HTMLInputElement)) throw new Error(`${selector} is no input`);
  return element;
}
