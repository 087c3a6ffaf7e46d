import { useState, type FormEvent } from 'react';
import type { z } from 'zod';
import { refusalOf } from '#client/lib/refusal.ts';

interface SmallFormOptions<T extends Record<string, string>> {
  /** names of the fields, as they stand in the form */
  names: readonly (keyof T & string)[];
  /** the schema, fetched with the first submission, so that a page with a few fields is there at once */
  schema: () => Promise<z.ZodType<T>>;
  /** sends what passed the schema; what it throws is told at the fields */
  send: (values: T) => Promise<unknown>;
  /** empty once it was sent */
  clears?: boolean;
  /** a field to tell a refusal at that points to none */
  blame?: (error: unknown) => (keyof T & string) | null;
}

/** A form of a few text fields, which the browser itself holds. */
export function useSmallForm<T extends Record<string, string>>(options: SmallFormOptions<T>) {
  const { names, schema, send, blame, clears = false } = options;
  const [errors, setErrors] = useState<Partial<Record<string, string>>>({});
  const [root, setRoot] = useState<string | null>(null);
  const [pending, setPending] = useState(false);

  const show = (
    form: HTMLFormElement,
    found: readonly (readonly [string, string])[],
    rest: string | null,
  ) => {
    setErrors(Object.fromEntries(found));
    setRoot(rest);
    const first = names.find((name) => found.some(([field]) => field === name));
    const input = first === undefined ? null : form.elements.namedItem(first);
    if (input instanceof HTMLElement) input.focus();
  };

  const submit = async (form: HTMLFormElement) => {
    const typed = new FormData(form);
    const parsed = (await schema()).safeParse(
      Object.fromEntries(names.map((name) => [name, text(typed, name)])),
    );
    if (!parsed.success) {
      const found = new Map<string, string>();
      for (const { path, message } of parsed.error.issues) {
        const field = String(path[0]);
        if (!found.has(field)) found.set(field, message);
      }
      return show(form, [...found], null);
    }
    show(form, [], null);
    try {
      await send(parsed.data);
      if (clears) form.reset();
    } catch (error) {
      const blamed = blame?.(error) ?? null;
      const refusal = refusalOf(error, names);
      if (blamed === null) show(form, refusal.fields, refusal.root);
      else show(form, [[blamed, refusal.root ?? '']], null);
    }
  };

  return {
    root,
    pending,
    /** for the form element */
    form: {
      noValidate: true,
      onSubmit: (event: FormEvent<HTMLFormElement>) => {
        event.preventDefault();
        if (pending) return;
        setPending(true);
        submit(event.currentTarget)
          .catch(() => setRoot('This page could not be fetched whole. Look at the connection and try again.'))
          .finally(() => setPending(false));
      },
    },
    /** for a text field */
    field: (name: keyof T & string) => ({
      name,
      error: errors[name],
      onInput: () => setErrors(({ [name]: _, ...rest }) => rest),
    }),
  };
}

function text(data: FormData, name: string): string {
  const value = data.get(name);
  return typeof value === 'string' ? value : '';
}
