import { describe, expect, it } from 'vitest';
import { RATE_LIMITS } from '#server/middleware/rate-limits.ts';
import { useApp } from '../support/app.ts';
import { makeUser, PASSWORD } from '../support/people.ts';
import { expectProblem } from '../support/problems.ts';
import { smallPlan } from '../support/rows.ts';

describe('limits of the everyday size', () => {
  const app = useApp({ rateLimitScale: 1 });

  it('refuse the account’s eleventh wrong password for a while, also from elsewhere, and no other account', async () => {
    const [user, other] = [await makeUser(), await makeUser()];
    const guess = (email: string, password: string) =>
      app.visitor().post('/api/session').send({ email, password });
    for (let i = 0; i < RATE_LIMITS.signInByAccount.hits; i += 1) {
      expectProblem(
        await guess(i % 2 ? user.email : user.email.toUpperCase(), `guess ${i}`),
        'wrong_credentials',
      );
    }
    const refused = await guess(user.email, PASSWORD);
    expectProblem(refused, 'rate_limited');
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    await guess(other.email, PASSWORD).expect(200);
  });

  it('do not count what went well', async () => {
    const user = await makeUser();
    for (let i = 0; i < RATE_LIMITS.signInByAccount.hits + 2; i += 1) {
      await app.visitor().post('/api/session').send({ email: user.email, password: PASSWORD }).expect(200);
    }
  });
});

describe('limits of a thousandth of that', () => {
  const app = useApp({ rateLimitScale: 0.001, proxies: 1 });

  it('refuse one address and let another through', async () => {
    const ask = (address: string) =>
      app.visitor().post('/api/estimates').set('X-Forwarded-For', address).send({ plan: smallPlan() });
    await ask('192.0.2.7').expect(200);
    expectProblem(await ask('192.0.2.7'), 'rate_limited');
    await ask('192.0.2.8').expect(200);
  });

  it('leave reading free', async () => {
    for (let i = 0; i < 5; i += 1) await app.visitor().get('/api/materials').expect(200);
  });
});
