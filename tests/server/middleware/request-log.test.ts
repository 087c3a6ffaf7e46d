import { Writable } from 'node:stream';
import { pino } from 'pino';
import { DatabaseError } from 'sequelize';
import { afterEach, describe, expect, it } from 'vitest';
import { errorForLog } from '#server/middleware/request-log.ts';
import { useApp } from '../support/app.ts';
import { makePerson, PASSWORD } from '../support/people.ts';
import { expectProblem } from '../support/problems.ts';
import { smallPlan } from '../support/rows.ts';

const lines: string[] = [];
const stream = new Writable({
  write(chunk: Buffer, _encoding, done) {
    lines.push(chunk.toString());
    done();
  },
});
const serializers = { err: errorForLog };
const app = useApp({ logger: pino({ level: 'info', serializers }, stream) });

afterEach(() => {
  lines.length = 0;
});

describe('the log', () => {
  it('has one line per request, without cookies, bodies, queries or passwords', async () => {
    const { user, agent } = await makePerson(app);
    const res = await agent.post('/api/session?token=1234').send({ email: user.email, password: PASSWORD });
    await agent.get('/api/gliders?search=secretname').expect(200);
    const [signIn, list] = lines.map((line) => JSON.parse(line));
    expect(lines).toHaveLength(2);
    expect(signIn).toMatchObject({ req: { method: 'POST', path: '/api/session' }, res: { status: 200 } });
    expect(list).toMatchObject({ req: { method: 'GET', path: '/api/gliders' } });
    const text = lines.join('');
    const id = /featherbeam_session=([^;]*)/.exec(String(res.headers['set-cookie']))?.[1] ?? 'none';
    for (const secret of [PASSWORD, user.email, user.passwordHash, id, 'token', 'secretname']) {
      expect(text).not.toContain(secret);
    }
  });

  it('tells an unexpected failure with its stack, while the answer tells neither that nor the statement', async () => {
    const { agent } = await makePerson(app);
    lines.length = 0;
    await app.sequelize.query('ALTER TABLE glider_saves RENAME TO glider_saves_away');
    try {
      const res = await agent.post('/api/gliders').send({ plan: smallPlan({ name: 'Private name' }) });
      const refusal = expectProblem(res, 'internal');
      expect(JSON.stringify(refusal)).not.toMatch(/glider_saves|INSERT|at .*\.ts/);
    } finally {
      await app.sequelize.query('ALTER TABLE glider_saves_away RENAME TO glider_saves');
    }
    const failures = lines.map((line) => JSON.parse(line)).filter(({ level }) => level >= 50);
    expect(failures).toHaveLength(1);
    expect(failures[0].err.message).toContain('glider_saves');
    expect(failures[0].err.stack).toContain('services/gliders.ts');
    expect(lines.join('')).not.toContain('Private name');
  });

  it('leaves out of a database error what may hold typed values', () => {
    const parent = Object.assign(new Error('bad'), {
      sql: "INSERT 'hash'",
      parameters: ['hash'],
      detail: 'hash',
    });
    const log: string[] = [];
    const sink = new Writable({
      write(chunk: Buffer, _encoding, done) {
        log.push(chunk.toString());
        done();
      },
    });
    pino({ serializers }, sink).error({ err: new DatabaseError(parent) }, 'failed');
    expect(log.join('')).toContain('"message":"bad"');
    expect(log.join('')).not.toContain('hash');
  });
});
