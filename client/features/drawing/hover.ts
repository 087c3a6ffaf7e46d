import { useSyncExternalStore } from 'react';

/** The line that the pointer is over, kept beside React so that moving the pointer renders only what lights up. */
export class Hover {
  private line: string | null = null;
  private readonly listeners = new Set<() => void>();

  readonly get = (): string | null => this.line;

  readonly set = (line: string | null): void => {
    if (this.line === line) return;
    this.line = line;
    for (const listener of this.listeners) listener();
  };

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };
}

export function useHovered(hover: Hover): string | null {
  return useSyncExternalStore(hover.subscribe, hover.get);
}

export function useIsHovered(hover: Hover, line: string): boolean {
  return useSyncExternalStore(hover.subscribe, () => hover.get() === line);
}
