import { readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { ROOT, sourcesIn, withoutComments, type Source } from './sources.ts';

const ALL = sourcesIn(['shared', 'server', 'client', 'tests']);
const TOP_LEVEL = [
  'README.md',
  'DEVELOPERS.md',
  'package.json',
  'package-lock.json',
  'tsconfig.json',
  'vite.config.ts',
  'tailwind.config.ts',
  'index.html',
  'client',
  'server',
  'shared',
  'tests',
  'data',
  'node_modules',
];
const LONGEST = 250;

/** Lines of code that match, as file:line: text. */
function found(files: Source[], pattern: RegExp, part: 'code' | 'text' = 'code'): string[] {
  return files.flatMap((file) =>
    file[part]
      .split('\n')
      .flatMap((line, index) => (pattern.test(line) ? [`${file.path}:${index + 1}: ${line.trim()}`] : [])),
  );
}

/** A word put together here, so that this file does not hold it. */
const word = (...parts: string[]) => parts.join('');

describe('the house', () => {
  it('holds nothing at its top level beyond the agreed list and dotfiles', () => {
    const names = readdirSync(ROOT).filter((name) => !name.startsWith('.') && !name.endsWith('.log'));
    expect(names.filter((name) => !TOP_LEVEL.includes(name))).toEqual([]);
  });

  it('keeps every source file within 250 lines', () => {
    const long = ALL.map(({ path, text }) => ({ path, lines: text.trimEnd().split('\n').length }));
    expect(long.filter(({ lines }) => lines > LONGEST)).toEqual([]);
  });

  it('has no barrels: no file only passes on what others export', () => {
    const passesOn = /^export\s+(?:type\s+)?(?:\*(?:\s+as\s+\w+)?|\{[^}]*\})\s*from\s*['"][^'"]+['"];?/gm;
    const isBarrel = ({ code }: Source) => passesOn.test(code) && code.replace(passesOn, '').trim() === '';
    expect(ALL.filter(isBarrel).map(({ path }) => path)).toEqual([]);
  });

  it('names its files in small letters with dashes', () => {
    const odd = ALL.filter(({ path }) => !/^[a-z0-9-]+(\.[a-z]+)+$/.test(path.split('/').at(-1) ?? ''));
    expect(odd.map(({ path }) => path)).toEqual([]);
  });

  it('silences neither the compiler nor the linter', () => {
    const silencers = new RegExp(
      `@ts-(${word('ig', 'nore')}|${word('expect', '-error')}|${word('no', 'check')})|(es|ox)lint-${word('dis', 'able')}`,
    );
    expect(found(ALL, silencers, 'text')).toEqual([]);
  });
});

describe('the core', () => {
  it('knows no clock, no chance, no locale, no machine and no console', () => {
    const impure =
      /\bDate\.now\b|\bnew Date\b|\bMath\.random\b|\bIntl\b|\bconsole\b|\btoLocale\w+|\bperformance\b|\bglobalThis\b|\bprocess\./;
    const core = sourcesIn(['shared/core']);
    expect(core.length).toBeGreaterThan(0);
    expect(found(core, impure)).toEqual([]);
  });
});

describe('the tests', () => {
  const tests = ALL.filter(({ path }) => path.startsWith('tests/'));

  it('are never left out, nor taken alone', () => {
    const partial =
      /\b(?:it|test|describe|suite|bench)(?:\.\w+)*\.(?:skip|only|todo|skipIf|runIf|fails)\b|\b(?:ctx|context|t)\.skip\(|\b[xf](?:it|describe)\(/;
    expect(partial.test(word('it.', 'skip("x")')) && partial.test(word('describe.', 'only('))).toBe(true);
    expect(found(tests, partial)).toEqual([]);
  });
});

describe('the reader of sources', () => {
  it('blanks comments and leaves strings, templates and patterns', () => {
    const text = `const a = 'http://x'; // b\nconst c = \`//d\`; /* e\nf */ const g = /[/]\\/\\//; const h = 4 / 2; // i`;
    const code = withoutComments(text);
    expect(code.split('\n').map((line) => line.trimEnd())).toEqual([
      `const a = 'http://x';`,
      'const c = `//d`;',
      '     const g = /[/]\\/\\//; const h = 4 / 2;',
    ]);
  });
});
