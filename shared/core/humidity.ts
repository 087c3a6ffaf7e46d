import { percentOfMac } from './balance.ts';
import { equilibriumMoisture, massAtMoisture } from './moisture.ts';
import type { Plan, PlanMaterial } from './plan.ts';
import type { Estimate, Line } from './result.ts';
import { wingReference } from './wing-reference.ts';

/** Air as wood feels it. */
export interface DampAir {
  /** °C */
  temperature: number;
  /** relative, a fraction from 0 to below 1 */
  humidity: number;
}

/** A model whose bare wood has come to rest with an air. */
export interface InAir {
  /** moisture of the wood, a fraction of its ovendry mass */
  moisture: number;
  /** of the model, g */
  mass: number;
  /** mass that is wood, g */
  wood: number;
  /** balance point, mm aft of the datum; null where nothing has a mass */
  x: number | null;
  /** null without a wing */
  percentMac: number | null;
}

/**
 * True of a material that takes up and gives off water with the air, as far as is reckoned: wood. Ply, covering and
 * glue move too, but less, and by no curve that is known here.
 * @example takesUpWater({ category: 'wood' }) // → true
 */
export function takesUpWater(material: Pick<PlanMaterial, 'category'> | undefined): boolean {
  return material?.category === 'wood';
}

/**
 * The model as drawn with its wood at rest with an air: mass and balance as a bound, for all wood is taken as bare.
 * Each wood's mass goes from the moisture at which its density holds (`moistureAtDensity`) to that of the air, as
 * (1 + x₂)/(1 + x₁). Wood whose moisture the plan does not know was weighed in `workshop` air. Null where the
 * moisture equation says nothing of one of the airs.
 * @example inAir(EXAMPLE_PLAN, EXAMPLE_ESTIMATE, { temperature: 20, humidity: 0.5 }, { temperature: 20, humidity: 0.5 })?.mass // → 19.256
 */
export function inAir(
  plan: Plan,
  { lines }: Pick<Estimate, 'lines'>,
  air: DampAir,
  workshop: DampAir,
): InAir | null {
  const moisture = equilibriumMoisture(air.temperature, air.humidity);
  const inWorkshop = equilibriumMoisture(workshop.temperature, workshop.humidity);
  if (moisture === null || inWorkshop === null) return null;
  const massOf = (line: Line) => {
    const material = line.material === null ? undefined : plan.materials[line.material];
    return takesUpWater(material)
      ? massAtMoisture(line.mass, material?.moistureAtDensity ?? inWorkshop, moisture)
      : line.mass;
  };
  let [mass, wood, moment] = [0, 0, 0];
  for (const line of lines) {
    const now = massOf(line);
    mass += now;
    moment += now * line.at[0];
    if (takesUpWater(line.material === null ? undefined : plan.materials[line.material])) wood += now;
  }
  const x = mass > 0 ? moment / mass : null;
  const reference = wingReference(plan);
  return {
    moisture,
    mass,
    wood,
    x,
    percentMac: x === null || !reference ? null : percentOfMac(x, reference.xLeMac, reference.mac),
  };
}
