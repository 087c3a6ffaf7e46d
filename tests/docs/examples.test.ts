import { join } from 'node:path';
import { createContext, runInContext } from 'node:vm';
import { pathToFileURL } from 'node:url';
import { describe, expect, it } from 'vitest';
import { Scanner } from '#shared/units/scan.ts';
import { importsOf, ROOT, sourcesIn, type Source } from '#tests/architecture/sources.ts';
import { differences } from './compare.ts';
import { docstringOf, isCallable, showsCallOf, wordsOf } from './docstrings.ts';

interface Example {
  where: string;
  file: Source;
  call: string;
  result: string;
}

const EXAMPLE = /@example\s+(?<call>.+?)\s*\/\/ → (?<result>.+?)\s*(?:\*\/.*)?$/;

const lines = sourcesIn(['shared'], /\.ts$/).flatMap((file) =>
  file.text
    .split('\n')
    .flatMap((line, index) =>
      line.includes('@example') ? [{ file, line, where: `${file.path}:${index + 1}` }] : [],
    ),
);

const examples: Example[] = lines.flatMap(({ file, line, where }) => {
  const { call, result } = EXAMPLE.exec(line)?.groups ?? {};
  return call && result ? [{ where, file, call, result }] : [];
});

/** The wing that longer examples are worked on. */
const EXAMPLE_WING = 'shared/core/example-wing.ts';

const modulesOf = (paths: readonly string[]): Promise<object[]> =>
  Promise.all(paths.map((path) => import(/* @vite-ignore */ pathToFileURL(join(ROOT, path)).href)));

/** What an example may name: the exports of its own file, of the files that this one imports, and the example wing. */
async function inScope(file: Source): Promise<object> {
  const paths = importsOf(file).map(({ leads }) => leads);
  const files = [EXAMPLE_WING, ...paths.filter((path) => path.startsWith('shared/')), file.path];
  return Object.assign({}, ...(await modulesOf(files)));
}

describe('the examples beside the functions', () => {
  it('are all written “f(x) // → y” on one line, so that every one is run', () => {
    const run = new Set(examples.map(({ where }) => where));
    expect(
      lines.filter(({ where }) => !run.has(where)).map(({ where, line }) => `${where}: ${line.trim()}`),
    ).toEqual([]);
    expect(examples.length).toBeGreaterThan(0);
  });

  it.each(examples)('hold: $where: $call is $result', async ({ file, call, result }) => {
    const scope = createContext(await inScope(file));
    const evaluate = (expression: string): unknown =>
      runInContext(`(${expression})`, scope, { timeout: 5000 });
    expect(differences(evaluate(call), evaluate(result))).toEqual([]);
  });
});

describe('every function that the core, the units and the formats export', async () => {
  const files = sourcesIn(['shared/core', 'shared/units', 'shared/format'], /\.ts$/);
  const modules = await modulesOf(files.map(({ path }) => path));
  const functions = files.flatMap(({ path, text }, i) =>
    Object.entries(modules[i] ?? {})
      .filter(([, value]) => isCallable(value))
      .map(([name]) => ({ name, where: `${path}: ${name}`, docstring: docstringOf(text, name) })),
  );

  it('is shown at work by an example of its own', () => {
    expect(functions.length).toBeGreaterThan(0);
    const mute = functions.filter(({ name, docstring }) => !showsCallOf(docstring, name));
    expect(mute.map(({ where }) => where)).toEqual([]);
  });

  it('says in words what it does', () => {
    const wordless = functions.filter(({ docstring }) => wordsOf(docstring) === '');
    expect(wordless.map(({ where }) => where)).toEqual([]);
  });
});

describe('the reader of docstrings', () => {
  const text = `/** Twice. @example twice(2) // → 4 */\nexport const twice = (n: number) => 2 * n;\nexport function thrice() {}`;

  it('takes no comment for that of a neighbour', () => {
    expect(docstringOf(text, 'twice')).toContain('@example');
    expect(docstringOf(text, 'thrice')).toBe('');
    expect(docstringOf(text, 'twic')).toBe('');
  });

  it('tells words from tags, and an example of the function from one of another', () => {
    const docstring = docstringOf(text, 'twice');
    expect(wordsOf(docstring)).toBe('Twice.');
    expect(wordsOf('* @example twice(2) // → 4')).toBe('');
    expect(showsCallOf(docstring, 'twice')).toBe(true);
    expect(showsCallOf(docstring, 'thrice')).toBe(false);
    expect(showsCallOf('Twice, like twice(2) // → 4', 'twice')).toBe(false);
  });

  it('tells functions from classes and figures', () => {
    expect([isCallable(docstringOf), isCallable(Scanner), isCallable(1)]).toEqual([true, false, false]);
  });
});

describe('the comparison of an example with its result', () => {
  it('lets numbers lie apart by one part in a thousand million and no more', () => {
    expect(differences(1 + 5e-10, 1)).toEqual([]);
    expect(differences(1 + 5e-9, 1)).toHaveLength(1);
    expect(differences(1e-12, 0)).toHaveLength(1);
    expect(differences(Number.NaN, 1)).toHaveLength(1);
  });

  it('looks into lists and objects, and misses neither a part too many nor one too few', () => {
    expect(differences({ a: [1, { b: 'x' }] }, { a: [1, { b: 'x' }] })).toEqual([]);
    expect(differences({ a: [1, { b: 'y' }] }, { a: [1, { b: 'x' }] })).toEqual([
      '.a.1.b: "y" instead of "x"',
    ]);
    expect(differences({ a: 1, b: 2 }, { a: 1 })).toHaveLength(1);
    expect(differences([1], [1, 2])).toHaveLength(1);
    expect(differences(null, {})).toHaveLength(1);
    expect(differences([], {})).toHaveLength(1);
  });
});
