import type { z } from 'zod';

const TYPES: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  tuple: 'a list',
  object: 'an object',
  record: 'an object',
};

const list = (values: readonly unknown[]) => values.map(String).join(', ');

/** Words what a schema leaves unworded. A schema's own message goes before this. */
export function wordIssue(issue: z.core.$ZodRawIssue): string | undefined {
  switch (issue.code) {
    case 'invalid_type':
      if (issue.input === undefined) return 'Is missing.';
      return `Must be ${TYPES[issue.expected] ?? issue.expected}.`;
    case 'invalid_value':
      if (issue.input === undefined) return 'Is missing.';
      return issue.values.length === 1
        ? `Must be ${list(issue.values)}.`
        : `Must be one of ${list(issue.values)}.`;
    case 'invalid_union':
      return issue.input === undefined ? 'Is missing.' : 'Is of no known kind.';
    case 'invalid_format':
      return issue.format === 'uuid' ? 'Must be a UUID.' : 'Is not of the right form.';
    case 'too_big':
    case 'too_small':
      return wordSize(issue);
    default:
      return undefined;
  }
}

type SizeIssue = Extract<z.core.$ZodRawIssue, { code: 'too_big' | 'too_small' }>;

function wordSize(issue: SizeIssue): string {
  const bound =
    issue.code === 'too_big'
      ? `${issue.inclusive === false ? 'less than' : 'at most'} ${issue.maximum}`
      : `${issue.inclusive === false ? 'more than' : 'at least'} ${issue.minimum}`;
  if (issue.origin === 'string') return `Must have ${bound} characters.`;
  if (issue.origin === 'array') return `Must have ${bound} entries.`;
  return `Must be ${bound}.`;
}
