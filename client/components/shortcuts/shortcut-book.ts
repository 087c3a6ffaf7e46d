import { useEffect, useRef, useSyncExternalStore } from 'react';

/** Something that a key does. */
export interface Shortcut {
  /** as it is told, and, where it runs something, as the browser names it: `m`, `?`, `Ctrl+Z` */
  keys: string;
  what: string;
  /** left out where the key acts by itself on what has the focus, and is only told */
  run?: () => void;
}

export interface ShortcutGroup {
  title: string;
  shortcuts: readonly Shortcut[];
}

const KEPT = 'featherbeam.keys';

/** What the keys do on the page that is shown, and whether single keys do anything at all. */
class ShortcutBook {
  private groups: readonly { current: ShortcutGroup }[] = [];
  private isOpen = false;
  private areOn = read();
  private readonly listeners = new Set<() => void>();

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly open = (): boolean => this.isOpen;
  /** Single keys can be turned off, for whoever speaks to the machine or rests a hand on it (WCAG 2.2, 2.1.4). */
  readonly on = (): boolean => this.areOn;
  readonly all = (): ShortcutGroup[] => this.groups.map(({ current }) => current);

  readonly setOpen = (open: boolean): void => this.change(() => (this.isOpen = open));

  readonly setOn = (on: boolean): void =>
    this.change(() => {
      this.areOn = on;
      keep(on);
    });

  add(group: { current: ShortcutGroup }): () => void {
    this.groups = [...this.groups, group];
    return () => {
      this.groups = this.groups.filter((other) => other !== group);
    };
  }

  private change(make: () => unknown): void {
    make();
    for (const listener of this.listeners) listener();
  }
}

function read(): boolean {
  try {
    return localStorage.getItem(KEPT) !== 'off';
  } catch {
    return true;
  }
}

function keep(on: boolean): void {
  try {
    if (on) localStorage.removeItem(KEPT);
    else localStorage.setItem(KEPT, 'off');
  } catch {
    // It then holds until the page is left.
  }
}

export const shortcutBook = new ShortcutBook();

/** Enters what the keys do while a part of a page is shown. */
export function useShortcuts(title: string, shortcuts: readonly Shortcut[]): void {
  const group = useRef<ShortcutGroup>({ title, shortcuts });
  useEffect(() => {
    group.current = { title, shortcuts };
  });
  useEffect(() => shortcutBook.add(group), []);
}

export function useShortcutsOpen(): boolean {
  return useSyncExternalStore(shortcutBook.subscribe, shortcutBook.open);
}

export function useSingleKeys(): boolean {
  return useSyncExternalStore(shortcutBook.subscribe, shortcutBook.on);
}
