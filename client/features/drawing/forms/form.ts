/** One thing of the plan laid out in fields: what it is now, how to change it, and what is wrong with it. */
export interface Form<T> {
  value: T;
  /** Changes some of its fields. `field` names the change, so that quick repeats undo together. */
  set: (changes: Partial<T>, field: string) => void;
  /** What is wrong at a path under it, such as `width/0`; undefined when nothing is. */
  issue: (path: string) => string | undefined;
  readOnly: boolean;
}

/** Names of the fields that hold a value of some type. */
export type KeysOf<T, V> = {
  [K in keyof T]-?: [T[K]] extends [V | undefined] ? K : never;
}[keyof T] &
  string;
