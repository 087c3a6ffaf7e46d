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

/** Types into a field as a person does: the browser's setter, then the event that React listens to. */
export async function type(input: HTMLInputElement, text: string): Promise<void> {
  const setter = Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')?.set;
  await act(async () => {
    setter?.call(input, text);
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
export function only<T extends HTMLElement>(root: ParentNode, selector: string): T {
  const found = root.querySelectorAll<T>(selector);
  const [first] = found;
  if (!first || found.length > 1) throw new Error(`${found.length} elements fit ${selector}`);
  return first;
}
