import { describe, expect, it } from 'vitest';
import { balanceVerdict } from '#client/features/gliders/verdict.ts';
import type { Balance } from '#shared/core/result.ts';
import { USUAL_UNITS } from '#shared/format/units.ts';

const balance = (percentMac: number | null, uPercentMac = 0.5): Balance => ({
  x: 70,
  u: 1,
  percentMac,
  uPercentMac,
  neutralPoint: null,
  staticMargin: null,
});
const plan = { target: { percentMac: 52, tolerance: 2 } };
const outside = {
  code: 'balance_outside_target' as const,
  path: 'plan' as const,
  byMm: -3.2,
  byPercentMac: -2.5,
};

describe('verdict on the balance', () => {
  it('is outside as the estimate says, with the distance and the side', () => {
    expect(balanceVerdict(plan, { balance: balance(49.5), notices: [outside] }, USUAL_UNITS)).toEqual({
      kind: 'outside',
      text: '3.2\u202fmm ahead of wanted',
    });
  });

  it('is close where the uncertainty reaches over the edge of the range', () => {
    expect(balanceVerdict(plan, { balance: balance(53.6), notices: [] }, USUAL_UNITS)?.kind).toBe('close');
    expect(balanceVerdict(plan, { balance: balance(53.6, 0.3), notices: [] }, USUAL_UNITS)?.kind).toBe(
      'inside',
    );
  });

  it('is none where nothing is wanted or nothing balances', () => {
    expect(balanceVerdict({}, { balance: balance(53), notices: [] }, USUAL_UNITS)).toBeNull();
    expect(balanceVerdict(plan, { balance: balance(null), notices: [] }, USUAL_UNITS)).toBeNull();
  });
});
