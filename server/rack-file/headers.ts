import { QUANTITIES } from '#shared/units/quantities.ts';
import { SPELLINGS } from '#shared/units/spellings.ts';
import type { Unit } from '#shared/units/units.ts';

/** What a column may be. The diameter of a tube is its width and its thickness. */
export const COLUMNS = {
  kind: ['kind', 'type', 'shape'],
  material: ['material', 'wood', 'species', 'name'],
  category: ['category'],
  materialKey: ['material key', 'key'],
  length: ['length', 'len'],
  width: ['width', 'breadth'],
  thickness: ['thickness', 'thick', 'height', 'depth'],
  diameter: ['diameter', 'outer diameter', 'outside diameter'],
  wall: ['wall', 'wall thickness'],
  mass: ['mass', 'weight'],
  resolution: ['scale step', 'resolution', 'readability'],
  grade: ['grade'],
  grainCut: ['grain cut', 'cut', 'grain'],
  note: ['note', 'notes', 'remark', 'remarks', 'comment', 'comments'],
  /** written out for the reader; a piece that comes in is free */
  state: ['state', 'status'],
} as const;

export type ColumnField = keyof typeof COLUMNS;

const MEASURED = {
  length: 'length',
  width: 'length',
  thickness: 'length',
  diameter: 'length',
  wall: 'length',
  mass: 'mass',
  resolution: 'mass',
} as const satisfies Partial<Record<ColumnField, 'length' | 'mass'>>;

export type MeasuredField = keyof typeof MEASURED;

export const quantityOf = (field: MeasuredField) => MEASURED[field];
const isMeasured = (field: ColumnField): field is MeasuredField => field in MEASURED;

export interface Column {
  header: string;
  /** null for a column that is not looked at */
  field: ColumnField | null;
  /** null where the column is not measured, or its unit is not known */
  unit: Unit | null;
  /** as it stands in the header, where it is no unit of what the column measures */
  unknownUnit: string | null;
}

const NAMES = new Map(
  (Object.keys(COLUMNS) as ColumnField[]).flatMap((field) =>
    COLUMNS[field].map((name) => [name as string, field] as const),
  ),
);

/** `Length (in)`, `mass [g]`, `Width, mm`, `thickness mm`, `length/mm` */
const WITH_UNIT = /^(.*?)\s*(?:\(\s*([^()]*)\s*\)|\[\s*([^[\]]*)\s*\]|[,/]\s*(\S+)|\s(\S+))$/;

/** A longer title names no column that is known, and is not even looked through. */
export const LONGEST_HEADER = 120;

/** What the cell of a first line says of its column. */
export function readHeader(header: string): Column {
  if (header.length > LONGEST_HEADER) return { header, field: null, unit: null, unknownUnit: null };
  const text = header
    .trim()
    .toLowerCase()
    .replace(/[_\s]+/g, ' ');
  const plain = NAMES.get(text);
  if (plain) return columnOf(header, plain, '');
  const [, name = '', ...units] = WITH_UNIT.exec(text) ?? [];
  const field = NAMES.get(name);
  if (field === undefined) return { header, field: null, unit: null, unknownUnit: null };
  return columnOf(header, field, units.find((unit) => unit !== undefined) ?? '');
}

function columnOf(header: string, field: ColumnField, written: string): Column {
  if (!isMeasured(field)) return { header, field, unit: null, unknownUnit: null };
  const { base, units } = QUANTITIES[quantityOf(field)];
  if (written === '') return { header, field, unit: base, unknownUnit: null };
  const offered: readonly Unit[] = units;
  const unit = SPELLINGS.get(written.replace(/[\s.]/g, ''))?.find((one) => offered.includes(one));
  return { header, field, unit: unit ?? null, unknownUnit: unit === undefined ? written : null };
}

/** The columns of a first line; a field that is named twice is read from the first of them. */
export function readHeaders(cells: readonly string[]): Column[] {
  const taken = new Set<ColumnField>();
  return cells.map((cell) => {
    const column = readHeader(cell);
    if (column.field === null) return column;
    if (taken.has(column.field)) return { header: cell, field: null, unit: null, unknownUnit: null };
    taken.add(column.field);
    return column;
  });
}

/** Names of columns that a table of stock cannot do without and that are not there. */
export function missingColumns(columns: readonly Column[]): string[] {
  const has = (field: ColumnField) => columns.some((column) => column.field === field);
  const round = has('diameter');
  return [
    ...(has('material') ? [] : ['Material']),
    ...(has('length') ? [] : ['Length']),
    ...(has('width') || round ? [] : ['Width']),
    ...(has('thickness') || round ? [] : ['Thickness']),
  ];
}
