import { spawn, type ChildProcess } from 'node:child_process';
import { Agent, get } from 'node:http';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { fileURLToPath } from 'node:url';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { openSequelize } from '#server/db/sequelize.ts';
import { ownDatabase } from './support/database.ts';

// Each test starts whole programs, which takes its time on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const ROOT = fileURLToPath(new URL('../..', import.meta.url));

interface Program {
  child: ChildProcess;
  /** what it has written so far */
  output: () => string;
  exited: Promise<number | null>;
}

const running: ChildProcess[] = [];

function start(settings: Record<string, string>, file = 'server/index.ts', args: string[] = []): Program {
  const env = { PATH: process.env['PATH'] ?? '', LOG_LEVEL: 'warn', ...settings };
  const child = spawn(process.execPath, ['--import', 'tsx', file, ...args], { cwd: ROOT, env });
  running.push(child);
  let text = '';
  child.stdout.on('data', (chunk) => (text += chunk));
  child.stderr.on('data', (chunk) => (text += chunk));
  const exited = new Promise<number | null>((resolve) => child.on('exit', resolve));
  return { child, output: () => text, exited };
}

async function address({ output, exited }: Program): Promise<string> {
  let ended = false;
  void exited.then(() => (ended = true));
  for (;;) {
    const found = /listens on (http:\S+)/.exec(output())?.[1];
    if (found) return found;
    if (ended) throw new Error(output());
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

afterEach(() => {
  for (const child of running.splice(0)) child.kill('SIGKILL');
});

let databases = 0;
const freshDatabase = () => ownDatabase(`program_${(databases += 1)}`, 'empty');

describe('the program', () => {
  it('migrates, seeds and answers from an empty database, and stops cleanly with a client still connected', async () => {
    const program = start({ DATABASE_URL: await freshDatabase(), PORT: '0' });
    const url = await address(program);
    expect(url).toMatch(/^http:\/\/127\.0\.0\.1:\d+$/);
    const { materials } = await (await fetch(`${url}/api/materials`)).json();
    expect(materials.length).toBeGreaterThanOrEqual(45);

    const agent = new Agent({ keepAlive: true });
    await new Promise((resolve) =>
      get(`${url}/api/health`, { agent }, (res) => res.resume().on('end', resolve)),
    );
    program.child.kill('SIGTERM');
    expect(await program.exited).toBe(0);
    agent.destroy();
    expect(program.output()).toBe(`Featherbeam listens on ${url}\n`);
  });

  it('starts twice at once on one empty database', async () => {
    const database = await freshDatabase();
    const programs = [
      start({ DATABASE_URL: database, PORT: '0' }),
      start({ DATABASE_URL: database, PORT: '0' }),
    ];
    const lists = await Promise.all(
      programs.map(async (program) => (await fetch(`${await address(program)}/api/materials`)).json()),
    );
    expect(lists[0]).toEqual(lists[1]);
    for (const { child } of programs) child.kill('SIGINT');
    expect(await Promise.all(programs.map(({ exited }) => exited))).toEqual([0, 0]);
  });

  it('says in one sentence that the port is taken', async () => {
    const other = createServer().listen(0, '127.0.0.1');
    await new Promise((resolve) => other.once('listening', resolve));
    const { port } = other.address() as AddressInfo; // TCP, so never a path
    const program = start({ DATABASE_URL: await freshDatabase(), PORT: String(port) });
    expect(await program.exited).toBe(1);
    expect(program.output()).toBe(
      `Port ${port} on 127.0.0.1 is taken by another program. Stop it, or choose another with PORT.\n`,
    );
    other.close();
  });

  it('says which settings are wrong, all at once', async () => {
    const program = start({ DATABASE_URL: 'mysql://here', PORT: 'harbour' });
    expect(await program.exited).toBe(1);
    expect(program.output()).toBe(
      'DATABASE_URL must start with postgres://.\nPORT must be a number from 0 to 65535.\n',
    );
  });

  it('says in one sentence that the password is wrong, without waiting and without the password', async () => {
    const url = new URL(await freshDatabase());
    url.password = 'not-this-one';
    const program = start({ DATABASE_URL: url.href });
    expect(await program.exited).toBe(1);
    expect(program.output()).toBe('The database refuses the password in DATABASE_URL.\n');
  });

  it('refuses a database that is newer, in one sentence', async () => {
    const settings = { DATABASE_URL: await ownDatabase('newer', 'migrated'), PORT: '0' };
    const sequelize = openSequelize(settings.DATABASE_URL);
    await sequelize.query(`INSERT INTO applied_steps (name) VALUES ('29990101-1-later')`);
    await sequelize.close();
    const program = start(settings);
    expect(await program.exited).toBe(1);
    expect(program.output()).toMatch(
      /^The database was made by a newer Featherbeam \(step “29990101-1-later”\)\. .*\n$/,
    );
  });
});

describe('the commands for the database', () => {
  it('go up, tell, go down and seed', async () => {
    const settings = { DATABASE_URL: await freshDatabase() };
    const outputOf = async (file: string, ...args: string[]) => {
      const program = start(settings, file, args);
      expect(await program.exited).toBe(0);
      return program.output();
    };
    expect(await outputOf('server/db/migrate.ts')).toMatch(/^Done: 20261201-1-people, .*\n$/);
    expect(await outputOf('server/db/migrate.ts', 'status')).toMatch(/To do: nothing\.\n$/);
    expect(await outputOf('server/db/seed.ts')).toMatch(
      /^Materials: \d+ added, 0 renewed\. Editions of classes: \d+ added, 0 renewed\. Demo: added\.\n$/,
    );
    expect(await outputOf('server/db/seed.ts')).toBe(
      'Materials: 0 added, 0 renewed. Editions of classes: 0 added, 0 renewed. Demo: left as it is.\n',
    );
    expect(await outputOf('server/db/migrate.ts', 'down', 'all')).toMatch(
      /^Taken back: .*20261201-1-people\.\n$/,
    );
  });
});
