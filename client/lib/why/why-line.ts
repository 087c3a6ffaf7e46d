import type { Plan } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { formatQuantity, NARROW_SPACE } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import { inputsOf } from './part-inputs.ts';
import { sayIn } from './say.ts';
import { figureOf, makingOfPart, makingOfSolid, type Making } from './why-part.ts';
import type { Why } from './why.ts';

/** Why one line weighs what it weighs and where it stands. */
export function whyLine(plan: Plan, line: Line, units: Units): Why {
  const { grams, doubt, mm, moment } = sayIn(units);
  const [place, ...rest] = line.id.split('/');
  const id = rest.join('/');
  const material = line.material === null ? undefined : plan.materials[line.material];
  const balance = `Its centre of mass lies ${mm(Math.abs(line.at[0]))} ${line.at[0] < 0 ? 'ahead of' : 'aft of'} the datum: ${grams(line.mass)} × ${mm(line.at[0])} = ${moment(line.moment)}.`;
  const common = { title: line.name, inputs: inputsOf(plan, line, units) };
  if (!material) {
    return {
      ...common,
      formula: `${grams(line.mass)} as entered`,
      steps: [balance],
      doubt:
        line.u > 0
          ? `±${NARROW_SPACE}${doubt(line.u)} as entered with it.`
          : 'Entered without an uncertainty, so taken as exact.',
      source: null,
    };
  }
  const making = makingOf(plan, line, place ?? '', id, units);
  const byArea = line.volume === null || material.density === undefined;
  const measure =
    byArea && line.area !== null ? units.format(line.area, 'area', { small: true }) : making.measure;
  const product =
    making.product ?? (measure === null ? null : `${measure} × ${figureOf(material, byArea, units)}`);
  return {
    ...common,
    formula: product === null ? grams(line.mass) : `${grams(line.mass)} = ${product}`,
    steps: [...making.steps, balance],
    doubt: `±${NARROW_SPACE}${doubt(line.u)}: ${material.name} is known to ±${NARROW_SPACE}${formatQuantity(material.cv, 'fineShare')}.`,
    source: material.source ? `${material.name}: ${material.source}` : null,
  };
}

function makingOf(plan: Plan, line: Line, place: string, id: string, units: Units): Making {
  const surface = plan.surfaces.find(({ key }) => key === line.surface);
  const part = surface?.parts.find((one) => one.id === id);
  if (surface && part) return makingOfPart(plan, surface, part, line, units);
  const solid = place === 'solid' ? plan.solids.find((one) => one.id === id) : undefined;
  return solid ? makingOfSolid(solid, line, units) : { measure: null, steps: [] };
}
