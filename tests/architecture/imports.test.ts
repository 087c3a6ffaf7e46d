import { describe, expect, it } from 'vitest';
import { importsOf, sourcesIn, withoutComments, type Source } from './sources.ts';

const ALL = sourcesIn(['shared', 'server', 'client', 'tests']);
const AREAS = /^(shared|server|client|tests|data)\//;

interface Direction {
  claim: string;
  files: RegExp;
  /** What such a file may import; anything else is an offence. */
  allowed?: RegExp;
  /** What it may not import, whatever is allowed. */
  forbidden?: RegExp;
}

const PACKAGE = String.raw`(?!(?:shared|server|client|tests|data)/).+`;

const DIRECTIONS: Direction[] = [
  {
    claim: 'the core imports itself and exact decimals, nothing else',
    files: /^shared\/core\//,
    allowed: /^(shared\/core\/|decimal\.js$)/,
  },
  {
    claim: 'units import units, exact decimals and the list of unit names',
    files: /^shared\/units\//,
    allowed: /^(shared\/units\/|decimal\.js$|convert-units$)/,
  },
  {
    claim: 'shared code imports shared code and packages that run in a browser',
    files: /^shared\//,
    allowed: new RegExp(`^(shared/|${PACKAGE})`),
    forbidden: /^(node:|react|sequelize|express|pg$)/,
  },
  {
    claim: 'the server imports server, shared, data and packages',
    files: /^server\//,
    allowed: new RegExp(`^(server/|shared/|data/.*\\.json$|${PACKAGE})`),
    forbidden: /^react/,
  },
  {
    claim: 'the client imports client, shared, data and packages of the browser',
    files: /^client\//,
    allowed: new RegExp(`^(client/|shared/|data/.*\\.json$|${PACKAGE})`),
    forbidden: /^(node:|sequelize|express|pg$)/,
  },
  {
    claim: 'components, hooks and lib of the client know no feature and no page',
    files: /^client\/(components|hooks|lib)\//,
    forbidden: /^client\/(features|app)\//,
  },
  {
    claim: 'primitives of the client do not fetch',
    files: /^client\/components\/ui\//,
    forbidden: /^(client\/lib\/(api|query-client)\.|@tanstack\/react-query)/,
  },
  {
    claim: 'features know no page',
    files: /^client\/features\//,
    forbidden: /^client\/app\/(?!paths\.ts$)/,
  },
  {
    claim: 'routes leave the database to services',
    files: /^server\/routes\//,
    forbidden: /^(sequelize|pg$|server\/models\/)/,
  },
  {
    claim: 'migrations import no model and nothing shared, for history must not move',
    files: /^server\/db\/migrations\//,
    allowed: /^(server\/db\/migrations\/|sequelize$|umzug$)/,
  },
  { claim: 'nothing but tests imports tests', files: /^(shared|server|client)\//, forbidden: /^tests\// },
];

function offences(
  files: Source[],
  isOffence: (leads: string, written: string, path: string) => boolean,
): string[] {
  return files.flatMap((file) =>
    importsOf(file)
      .filter(({ leads, written }) => isOffence(leads, written, file.path))
      .map(({ written }) => `${file.path} imports ${written}`),
  );
}

describe('the direction of imports', () => {
  it.each(DIRECTIONS)('$claim', ({ files, allowed, forbidden }) => {
    const concerned = ALL.filter(({ path }) => files.test(path));
    expect(concerned.length).toBeGreaterThan(0);
    const isOffence = (leads: string) =>
      (allowed !== undefined && !allowed.test(leads)) || (forbidden?.test(leads) ?? false);
    expect(offences(concerned, isOffence)).toEqual([]);
  });

  it('leads from no feature of the client to another', () => {
    const feature = (path: string) => /^client\/features\/([^/]+)\//.exec(path)?.[1];
    const features = ALL.filter(({ path }) => feature(path));
    expect(features.length).toBeGreaterThan(0);
    const isOther = (leads: string, _: string, path: string) =>
      (feature(leads) ?? feature(path)) !== feature(path);
    expect(offences(features, isOther)).toEqual([]);
  });

  it('is written with real endings, and with an alias wherever it leaves its own area', () => {
    const area = (path: string) =>
      /^(client\/features\/[^/]+|[^/]+\/[^/]+)\//.exec(path)?.[1] ?? path.split('/')[0];
    const isOffence = (leads: string, written: string, path: string) =>
      (AREAS.test(leads) && !/\.(tsx?|mjs|json|css|svg)(\?\w+)?$/.test(leads)) ||
      (written.startsWith('../') && area(leads) !== area(path));
    expect(offences(ALL, isOffence)).toEqual([]);
  });
});

describe('the reader of imports', () => {
  it('finds every way of importing and no import in a comment', () => {
    const text = [
      `import { a } from '#shared/core/a.ts';`,
      `import type {\n  B,\n} from "./b.ts";`,
      `export { c } from '../c.ts';`,
      `import 'd/e.css';`,
      `const f = await import('#server/f.ts');`,
      `// import { g } from 'g';`,
      `/* import { h } from 'h'; */ const url = 'http://x'; import i from 'i';`,
    ].join('\n');
    const found = importsOf({ path: 'client/lib/x.ts', text, code: withoutComments(text) });
    expect(found.map(({ leads }) => leads)).toEqual([
      'shared/core/a.ts',
      'client/lib/b.ts',
      'client/c.ts',
      'd/e.css',
      'server/f.ts',
      'i',
    ]);
  });
});
