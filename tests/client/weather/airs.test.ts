import { describe, expect, it } from 'vitest';
import { airRows, keptAirs, overMinimum, USUAL_AIRS } from '#client/features/weather/airs.ts';
import { weatherHeadline } from '#client/features/weather/words.ts';
import { estimate } from '#shared/core/estimate.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';
import { demoPlan } from '#tests/support/plans.ts';

const plan = demoPlan('dunlin');
const rows = airRows(plan, estimate(plan), USUAL_AIRS);
const massOf = (key: string) => rows.find((row) => row.key === key)?.mass ?? Number.NaN;

describe('the model in several airs', () => {
  it('is lightest on the dry day and heaviest on the damp one', () => {
    expect(rows.map(({ key }) => key)).toEqual(['workshop', 'field', 'dry', 'damp']);
    const masses = [massOf('dry'), massOf('workshop'), massOf('field'), massOf('damp')];
    expect(masses).toEqual([...masses].sort((a, b) => a - b));
  });

  it('says how much the field adds, where it then balances and how far a day can carry it', () => {
    const { title, text } = weatherHeadline(rows, null, USUAL_UNITS);
    expect(title).toContain('heavier at the field than in the workshop');
    expect(text).toContain(`A dry day makes it ${USUAL_UNITS.format(massOf('dry'), 'mass')}`);
    expect(text).toContain('MAC instead of');
    expect(text).not.toContain('minimum');
  });

  it('says the field is lighter where its air is drier', () => {
    const { workshop, field } = USUAL_AIRS;
    const swapped = airRows(plan, estimate(plan), { workshop: field, field: workshop });
    expect(weatherHeadline(swapped, null, USUAL_UNITS).title).toContain('lighter at the field');
  });

  it('judges the dry day by the class minimum, unrounded', () => {
    expect(weatherHeadline(rows, massOf('dry') + 0.01, USUAL_UNITS).text).toContain(
      'short of the class minimum',
    );
    expect(weatherHeadline(rows, massOf('dry'), USUAL_UNITS).text).toContain('over the class minimum');
    expect(overMinimum(219.999, 220)).toMatchObject({ short: true });
  });

  it('leaves out an air of which nothing is known', () => {
    const wet = { ...USUAL_AIRS, field: { temperature: 15, humidity: 1 } };
    expect(airRows(plan, estimate(plan), wet).map(({ key }) => key)).toEqual(['workshop', 'dry', 'damp']);
    expect(keptAirs.safeParse(wet).success).toBe(false);
  });
});
