import { UNITS, type Unit } from './units.ts';

/** Ways of writing a unit besides its own name, lower case, superscripts as plain digits. */
const OTHER_SPELLINGS: Partial<Record<Unit, readonly string[]>> = {
  in: ['"', '″', "''", 'inch', 'inches'],
  ft: ["'", '′', 'foot', 'feet'],
  g: ['gr', 'gram', 'grams', 'gramme', 'grammes'],
  oz: ['ounce', 'ounces'],
  lb: ['lbs', 'pound', 'pounds'],
  in2: ['sqin'],
  ft2: ['sqft'],
  in3: ['cuin'],
  'lb/ft3': ['lbs/ft3', 'lb/cuft', 'lbs/cuft'],
  'oz/ft2': ['oz/sqft'],
  'oz/yd2': ['oz/sqyd'],
  'g.mm': ['gmm'],
  'oz.in': ['ozin'],
  'km/h': ['kmh', 'kph'],
  'ft/s': ['fps'],
  deg: ['°', 'degrees'],
  percent: ['%'],
};

/** Every accepted spelling and the units it may mean. */
export const SPELLINGS: ReadonlyMap<string, readonly Unit[]> = collect();

function collect(): Map<string, Unit[]> {
  const table = new Map<string, Unit[]>();
  for (const unit of Object.keys(UNITS) as Unit[]) {
    for (const spelling of [unit.toLowerCase(), ...(OTHER_SPELLINGS[unit] ?? [])]) {
      table.set(spelling, [...(table.get(spelling) ?? []), unit]);
    }
  }
  return table;
}
