import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { importPreview } from '#shared/schemas/rack.ts';
import { stockPieceInput, type StockPieceDto, type StockPieceInput } from '#shared/schemas/stock-piece.ts';
import { rackCsv } from '#server/presenters/rack-csv.ts';
import { readRack } from '#server/rack-file/read-rack.ts';

const nothing = () => undefined;

/** Reads a file whatever is in it: the answer is a preview of whole pieces, or a reason. */
function readWhole(bytes: Buffer): void {
  const result = readRack(bytes, nothing);
  if ('problem' in result) {
    expect(result.problem).not.toBe('');
    return;
  }
  const { rows, bad } = importPreview.parse(result);
  for (const { piece } of rows) expect(stockPieceInput.parse(piece)).toEqual(piece);
  for (const { problems } of bad) expect(problems.length).toBeGreaterThan(0);
  const lines = [...rows, ...bad].map(({ line }) => line);
  expect(new Set(lines).size).toBe(lines.length);
}

const cell = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 12 }),
  fc.constantFrom(
    '',
    '"',
    '""',
    '"a',
    'a"b',
    '1/16',
    '3 1/2 in',
    '1e9',
    '-1',
    '1,5',
    'NaN',
    'Infinity',
    '=1+1',
    '\0',
  ),
  fc.double().map(String),
  fc.constantFrom('sheet', 'tube', 'rod', 'Balsa', 'A', '100', '2', '900', '15.5'),
);
const header = fc.constantFrom(
  'Kind',
  'Material',
  'Length (in)',
  'Length (mm)',
  'Width',
  'Thickness [mm]',
  'Diameter',
  'Wall',
  'Mass (g)',
  'Mass (stone)',
  'Note',
  'Grain cut',
  'State',
  '__proto__',
  'constructor',
);
const table = fc
  .record({
    head: fc.array(header, { minLength: 4, maxLength: 12 }),
    rows: fc.array(fc.array(cell, { maxLength: 13 }), { maxLength: 8 }),
    delimiter: fc.constantFrom(',', ';', '\t'),
    end: fc.constantFrom('\n', '\r\n', '\r'),
  })
  .map(({ head, rows, delimiter, end }) =>
    ['Material', 'Length', 'Width', 'Thickness', ...head]
      .join(delimiter)
      .concat(end, rows.map((row) => row.join(delimiter)).join(end)),
  );

const text = (max: number) =>
  fc
    .oneof(
      fc.string({ unit: 'grapheme', maxLength: 20 }),
      fc.constantFrom(
        '=1+1',
        "'=1+1",
        '"; DROP',
        'a,b;c\td',
        'two\nlines',
        '+44',
        '@SUM',
        "''-x",
        '＝x',
        '-',
        "'",
        '"',
      ),
    )
    .map((value) => value.replace(/\r\n?/g, '\n').trim().slice(0, max));
const size = (max: number) => fc.double({ min: 0.1, max, noNaN: true });

const piece: fc.Arbitrary<StockPieceInput> = fc
  .record({
    kind: fc.constantFrom('sheet', 'stick', 'block', 'tube'),
    name: text(60),
    key: fc.option(fc.constantFrom('balsa-light', 'ply-0.4mm')),
    category: fc.constantFrom('wood', 'composite', 'metal', 'sheet'),
    length: size(2_000),
    width: size(200),
    thickness: size(50),
    mass: fc.option(size(100)),
    resolution: fc.option(fc.constantFrom(0.01, 0.1, 1)),
    grade: text(40),
    grainCut: fc.option(fc.constantFrom('A', 'B', 'C')),
    note: text(200),
  })
  .map(({ name, key, category, ...fields }) => ({
    ...fields,
    material: { key, name, category },
    thickness: fields.kind === 'tube' ? fields.width : fields.thickness,
    wall: fields.kind === 'tube' ? fields.width / 4 : null,
    resolution: fields.mass === null ? null : fields.resolution,
  }))
  .filter((input) => stockPieceInput.safeParse(input).success)
  .map((input) => stockPieceInput.parse(input));

const onRack = (input: StockPieceInput, i: number): StockPieceDto => ({
  ...input,
  id: '5f0c3f0e-6a43-4c57-9b8e-0d5c7f5f5a11',
  number: i + 1,
  state: 'free',
  weighed: input.mass !== null,
  density: null,
  reservedFor: null,
  usedIn: null,
  parent: null,
  hasPhoto: false,
  version: 1,
  createdAt: '2026-12-01T10:00:00.000Z',
  updatedAt: '2026-12-01T10:00:00.000Z',
});

describe('the reader of a table of stock', () => {
  it('answers any bytes with whole pieces or reasons, and never fails', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => readWhole(Buffer.from(bytes))),
      {
        numRuns: 500,
      },
    );
  });

  it('answers any table with whole pieces or reasons, and never fails', () => {
    fc.assert(
      fc.property(table, fc.constantFrom('utf8', 'utf16le', 'latin1'), (content, encoding) =>
        readWhole(Buffer.from(content, encoding)),
      ),
      { numRuns: 1_500 },
    );
  });

  it('reads the very pieces back that were written out, whatever is typed into them', () => {
    fc.assert(
      fc.property(fc.array(piece, { minLength: 1, maxLength: 6 }), (pieces) => {
        const result = readRack(Buffer.from(rackCsv(pieces.map(onRack))), nothing);
        if ('problem' in result) throw new Error(result.problem);
        expect(result.bad).toEqual([]);
        expect(result.rows.map((row) => row.piece)).toEqual(pieces);
      }),
      { numRuns: 500 },
    );
  });

  it('writes no cell that a spreadsheet would carry out', () => {
    fc.assert(
      fc.property(piece, (input) => {
        const { columns, rows } = (() => {
          const result = readRack(Buffer.from(rackCsv([onRack(input, 0)])), nothing);
          if ('problem' in result) throw new Error(result.problem);
          return result;
        })();
        expect([columns.length, rows.length]).toEqual([16, 1]);
        const [, line = ''] = rackCsv([onRack(input, 0)]).split('\r\n', 2);
        const starts = /(?:^|,)"?[=+\-@＝＋－＠]/u;
        const written = [input.material.name, input.grade, input.note];
        // Texts with a border inside would need a reader of their own here.
        if (written.every((value) => !/[",\n]/.test(value))) expect(line).not.toMatch(starts);
      }),
      { numRuns: 500 },
    );
  });
});
