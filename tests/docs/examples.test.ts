import { join } from 'node:path';
import { createContext, runInContext } from 'node:vm';
import { pathToFileURL } from 'node:url';
import { describe, expect, it } from 'vitest';
import { importsOf, ROOT, sourcesIn, type Source } from '#tests/architecture/sources.ts';
import { differences } from './compare.ts';

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

/** What an example may name: the exports of its own file, of the files that this one imports, and the example wing. */
async function inScope(file: Source): Promise<object> {
  const paths = importsOf(file).map(({ leads }) => leads);
  const files = [EXAMPLE_WING, ...paths.filter((path) => path.startsWith('shared/')), file.path];
  const modules = await Promise.all(
    files.map((path) => import(/* @vite-ignore */ pathToFileURL(join(ROOT, path)).href)),
  );
  return Object.assign({}, ...modules);
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
