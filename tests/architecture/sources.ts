import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';

export const ROOT = fileURLToPath(new URL('../..', import.meta.url));

export interface Source {
  /** From the top of the work tree, with forward slashes. */
  path: string;
  text: string;
  /** The text without its comments, line for line. */
  code: string;
}

/** Every source file of the given folders whose name ends as asked. */
export function sourcesIn(folders: readonly string[], ending = /\.(ts|tsx|mjs)$/): Source[] {
  return folders
    .flatMap((folder) => readdirSync(join(ROOT, folder), { withFileTypes: true, recursive: true }))
    .filter((entry) => entry.isFile() && ending.test(entry.name))
    .map((entry) => relative(ROOT, join(entry.parentPath, entry.name)).replaceAll('\\', '/'))
    .toSorted()
    .map((path) => {
      const text = readFileSync(join(ROOT, path), 'utf8');
      return { path, text, code: withoutComments(text) };
    });
}

/** Blanks comments out but keeps their line breaks; strings, templates and patterns are left as they are. */
export function withoutComments(text: string): string {
  const tokens =
    /'(?:\\.|[^'\\\n])*'|"(?:\\.|[^"\\\n])*"|`(?:\\.|[^`\\])*`|\/\*[^]*?\*\/|(?<=(?:^|[(,=:[!&|?{;]|=>|\breturn)\s*)\/(?![*/])(?:\\.|\[(?:\\.|[^\]\\\n])*\]|[^/\\\n])+\/|\/\/[^\n]*/g;
  return text.replace(tokens, (token) => (/^\/[*/]/.test(token) ? token.replace(/[^\n]/g, ' ') : token));
}

/**
 * What a file imports: paths inside the work tree without a leading #, or the names of packages.
 * @returns pairs of the specifier as written and where it leads
 */
export function importsOf({ path, code }: Source): { written: string; leads: string }[] {
  const specifiers =
    /(?:^|[\s;}])(?:import|export)\b[^'"`;=]*?\bfrom\s*(['"])(?<from>[^'"]+)\1|(?<![-\w'"])import\s*(?:\(\s*)?(['"])(?<bare>[^'"]+)\3/g;
  return [...code.matchAll(specifiers)].map(({ groups }) => {
    const written = groups?.['from'] ?? groups?.['bare'] ?? '';
    if (written.startsWith('#')) return { written, leads: written.slice(1) };
    if (written.startsWith('.'))
      return { written, leads: join(dirname(path), written).replaceAll('\\', '/') };
    return { written, leads: written };
  });
}
