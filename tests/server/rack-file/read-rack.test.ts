import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/schemas/limits.ts';
import { importPreview } from '#shared/schemas/rack.ts';
import type { StockMaterial } from '#shared/schemas/stock-piece.ts';
import { readRack } from '#server/rack-file/read-rack.ts';

const LIGHT: StockMaterial = { key: 'balsa-light', name: 'Balsa, light', category: 'wood' };
const find = (name: string) => (name === LIGHT.name ? LIGHT : undefined);

const bytesOf = (text: string) => Buffer.from(text, 'utf8');
function read(table: string | Buffer) {
  const result = readRack(typeof table === 'string' ? bytesOf(table) : table, find);
  if ('problem' in result) throw new Error(result.problem);
  return importPreview.parse(result);
}
function refusal(table: string) {
  const result = readRack(bytesOf(table), find);
  return 'problem' in result ? result.problem : null;
}
const HEAD = 'Kind,Material,Length (mm),Width (mm),Thickness (mm),Mass (g)';
const problemsOf = (line: string, head = HEAD) => {
  const { rows, bad } = read(`${head}\n${line}\n`);
  expect([rows.length, bad.length]).toEqual([0, 1]);
  return bad[0]?.problems.map(({ column }) => column);
};

describe('the reader of a table of stock', () => {
  it('reads a line as a piece, with the row of the table of materials that has its name', () => {
    const { encoding, delimiter, columns, rows, bad } = read(
      `${HEAD},Grade,Grain cut,Note\nsheet,"Balsa, light",1000,100,1.5,17.7,contest,c,"said ""dry"""\n`,
    );
    expect([encoding, delimiter, bad]).toEqual(['utf-8', ',', []]);
    expect(columns.slice(2, 6).map(({ field, unit }) => [field, unit])).toEqual([
      ['length', 'mm'],
      ['width', 'mm'],
      ['thickness', 'mm'],
      ['mass', 'g'],
    ]);
    expect(rows).toEqual([
      {
        line: 2,
        doubt: null,
        piece: {
          kind: 'sheet',
          material: LIGHT,
          length: 1000,
          width: 100,
          thickness: 1.5,
          wall: null,
          mass: 17.7,
          resolution: null,
          grade: 'contest',
          grainCut: 'C',
          note: 'said "dry"',
        },
      },
    ]);
  });

  it.each([
    ['Length (in)', '36'],
    ['length [in]', '36'],
    ['LENGTH in', '36"'],
    ['Length, inches', '24 + 12'],
    ['Length (")', '36'],
    ['length_in', '72/2'],
    ['Length (cm)', '91,44'],
    ['Length (ft)', '3'],
    ['Length', '914.4'],
    ['Length', '36 in'],
  ])('takes %s with %s for 914.4 mm', (head, cell) => {
    const { rows } = read(`Material;${head};Width;Thickness\nBalsa;${cell};100;2\n`);
    expect(rows[0]?.piece.length).toBeCloseTo(914.4, 9);
  });

  it('reads fractions of an inch and ounces, to the exact factors', () => {
    const { rows } = read(
      'Material\tLength (in)\tWidth (in)\tThickness (in)\tMass (oz)\nBalsa\t36\t3 1/2\t1/16\t.5\n',
    );
    expect(rows[0]?.piece).toMatchObject({ thickness: 1.5875, kind: 'sheet' });
    expect(rows[0]?.piece.width).toBeCloseTo(88.9, 9);
    expect(rows[0]?.piece.mass).toBeCloseTo(14.17476, 5);
  });

  it('reads decimal commas between semicolons, and after a line that names the border', () => {
    const line = 'Balsa;1000;100;1,5;17,7';
    for (const start of ['', 'sep=;\r\n']) {
      const { delimiter, rows } = read(`${start}Material;Length;Width;Thickness;Mass\r\n${line}\r\n`);
      expect([delimiter, rows[0]?.piece.mass, rows[0]?.piece.thickness]).toEqual([';', 17.7, 1.5]);
    }
  });

  it.each([
    ['utf-8', Buffer.from('\uFEFFMaterial,Length,Width,Thickness\nKühlbalsa,900,75,2\n', 'utf8')],
    ['utf-16', Buffer.from('\uFEFFMaterial,Length,Width,Thickness\nKühlbalsa,900,75,2\n', 'utf16le')],
    ['utf-16', Buffer.from('Material,Length,Width,Thickness\nKühlbalsa,900,75,2\n', 'utf16le')],
    [
      'utf-16',
      Buffer.from('\uFEFFMaterial,Length,Width,Thickness\nKühlbalsa,900,75,2\n', 'utf16le').swap16(),
    ],
    ['windows-1252', Buffer.from('Material,Length,Width,Thickness\nKühlbalsa,900,75,2\n', 'latin1')],
  ])('reads %s', (encoding, bytes) => {
    const preview = read(bytes);
    expect(preview.encoding).toBe(encoding);
    expect(preview.columns[0]).toMatchObject({ header: 'Material', field: 'material' });
    expect(preview.rows[0]?.piece.material.name).toBe('Kühlbalsa');
  });

  it('counts lines as an editor does, also behind blank ones and over a note of several', () => {
    const { rows, bad } = read(
      `\n${HEAD},Note\n\nsheet,Balsa,900,75,2,20,"two\nlines"\nsheet,Balsa,x,75,2,20,\n\nsheet,Balsa,900,75,2,20,\n`,
    );
    expect(rows.map(({ line }) => line)).toEqual([4, 8]);
    expect(rows[0]?.piece.note).toBe('two\nlines');
    expect(bad.map(({ line, text }) => [line, text])).toEqual([[6, 'sheet,Balsa,x,75,2,20,']]);
  });

  it('tells every bad cell by its column, and takes nothing of its line', () => {
    expect(problemsOf('sheet,Balsa,abc,-3,"1.234,5",0')).toEqual([
      'Length (mm)',
      'Width (mm)',
      'Thickness (mm)',
      'Mass (g)',
    ]);
    expect(problemsOf('plate,,900,75,2,20')).toEqual(['Kind', 'Material']);
    expect(problemsOf('sheet,Balsa,,75,2,20')).toEqual(['Length (mm)']);
    expect(problemsOf('sheet,Balsa,900,75 g,2,20 mm')).toEqual(['Width (mm)', 'Mass (g)']);
    expect(problemsOf('sheet,Balsa,1/0,75,2,20')).toEqual(['Length (mm)']);
    expect(problemsOf('sheet,Balsa,900,75,2,9999')).toEqual(['Mass (g)']);
    expect(problemsOf('sheet,Balsa,900,75,1,5,20')).toEqual([null]);
    expect(problemsOf('sheet,Bal"sa,900,75,2,"20')).toEqual([null]);
    expect(problemsOf('sheet,Bal\0sa,900,75,2,20')).toEqual([null]);
    expect(problemsOf('sheet,Balsa,900,75,2,20', HEAD.replace('Mass (g)', 'Mass (stone)'))).toEqual([
      'Mass (stone)',
    ]);
  });

  it('steps over a stray quotation mark and reads on behind it', () => {
    const good = 'sheet,Balsa,900,75,2,20';
    const { rows, bad } = read(
      `${HEAD}\n${good}\n"A" grade,Balsa,900,75,2,20\n${good}\nsheet,"Balsa\n${good}\n`,
    );
    expect(rows.map(({ line }) => line)).toEqual([2, 4, 6]);
    expect(bad.map(({ line, text }) => [line, text])).toEqual([
      [3, '"A" grade,Balsa,900,75,2,20'],
      [5, 'sheet,"Balsa'],
    ]);
  });

  it('takes an inch mark for an inch, quoted or not', () => {
    const { rows } = read(`${HEAD}\nsheet,Balsa,36",4",1/16",20\nsheet,Balsa,"36""","4""","1/16""",20\n`);
    expect(rows.map(({ piece }) => piece.thickness)).toEqual([1.5875, 1.5875]);
  });

  it('answers files made to keep it busy', () => {
    const long = LIMITS.csvBytes.max;
    const below = (line: string, count: number) => `${HEAD}\n${line.repeat(count)}`;
    for (const text of [
      ','.repeat(long),
      '"'.repeat(long),
      `Material,${'('.repeat(long)}`,
      `a;${','.repeat(long)} y;b`,
    ]) {
      expect(refusal(text)).not.toBeNull();
    }
    for (const text of [
      below('\n', long),
      below(', \n', long / 4),
      below('"a"b,1,1,1,1,1\n', 100_000),
      below(`${"'".repeat(long)}\n`, 1),
    ]) {
      expect(refusal(text)).toBeNull();
    }
  });

  it('knows tubes by their wall and rods by their name', () => {
    const head = 'Kind,Material,Length,Diameter,Wall';
    const { rows } = read(`${head}\ntube,Carbon,1000,6,0.5\nrod,Carbon,1000,3,\n,Carbon,1000,3,\n`);
    expect(rows.map(({ piece }) => [piece.kind, piece.width, piece.thickness, piece.wall])).toEqual([
      ['tube', 6, 6, 0.5],
      ['tube', 3, 3, 1.5],
      ['tube', 3, 3, 1.5],
    ]);
  });

  it('doubts densities that no wood has, and pieces that are spent', () => {
    const { rows } = read(
      `${HEAD},State\nsheet,Balsa,1000,100,1,50,\nsheet,Balsa,1000,100,10,5,\nsheet,Birch,1000,100,1,70,\nsheet,Balsa,1000,100,1,15,used\n`,
    );
    expect(rows.map(({ doubt }) => doubt)).toEqual([
      expect.stringContaining('1.4 times as heavy as the heaviest balsa'),
      expect.stringContaining('8 times as light as the lightest balsa'),
      null,
      expect.stringContaining('Was used'),
    ]);
  });

  it('takes the mark off that keeps a text from being a formula, and no other', () => {
    const { rows } = read(
      `${HEAD},Grade,Note\nsheet,'=SUM(A1),900,75,2,20,'dry,''+1\nsheet,Balsa,900,75,2,20,-light,@home\n`,
    );
    expect(rows.map(({ piece }) => [piece.material.name, piece.grade, piece.note])).toEqual([
      ['=SUM(A1)', "'dry", "'+1"],
      ['Balsa', '-light', '@home'],
    ]);
  });

  it('leaves out columns that it does not know, and the second of a kind', () => {
    const { columns } = read(
      'Material,Length (in),Length (mm),Width,Thickness,Shop\nBalsa,36,1,4,1,Corner\n',
    );
    expect(columns.map(({ field }) => field)).toEqual([
      'material',
      'length',
      null,
      'width',
      'thickness',
      null,
    ]);
  });

  it('refuses what is no table of stock as a whole', () => {
    expect(refusal('')).toMatch(/nothing/);
    expect(refusal('"Material" of it,Length,Width,Thickness\nBalsa,9,9,9\n')).toMatch(/first line/);
    expect(refusal('\n\n  \n')).toMatch(/nothing/);
    expect(refusal('Kind,Length\nsheet,900\n')).toBe(
      'Has no column Material, Width, Thickness: the first line must name the columns.',
    );
    expect(refusal('sheet,Balsa,900,75,2\n')).toMatch(/no column Material/);
    expect(refusal(`${HEAD}${',x'.repeat(100)}\n`)).toMatch(/100 columns/);
    const line = 'sheet,Balsa,900,75,2,20\n';
    expect(refusal(`${HEAD}\n${line.repeat(LIMITS.rackImport.max)}`)).toBeNull();
    expect(refusal(`${HEAD}\n${line.repeat(LIMITS.rackImport.max + 1)}`)).toMatch(/2000 lines/);
  });
});
