import { mkdtempSync, rmSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pino } from 'pino';
import type { Sequelize } from 'sequelize';
import request from 'supertest';
import { afterAll, afterEach, beforeAll, beforeEach, expect, vi } from 'vitest';
import { createApp, type AppSettings } from '#server/app.ts';
import { folderStore } from '#server/storage/folder-store.ts';
import { openSequelize } from '#server/db/sequelize.ts';
import { workerDatabase } from './database.ts';

/** The application listening on loopback for one test file. */
export interface TestApp {
  /** address of the running server */
  url: string;
  sequelize: Sequelize;
  /** folder of stored files */
  files: string;
  /** somebody without a cookie */
  visitor(): ReturnType<typeof request.agent>;
}

/** Where mailed links lead. */
export const ADDRESS = 'https://featherbeam.example';

const GENEROUS = 100_000;

/**
 * Starts the application before the tests of a file and stops it after them. A line written to the console by
 * mistake fails the test.
 */
export function useApp(changes: Partial<AppSettings> = {}, database = workerDatabase): TestApp {
  const files = mkdtempSync(join(tmpdir(), 'featherbeam-files-'));
  const state: { server?: Server; sequelize?: Sequelize; url?: string } = {};
  const running = <T>(value: T | undefined): T => {
    if (value === undefined) throw new Error('The application runs only during tests.');
    return value;
  };

  beforeAll(async () => {
    state.sequelize = openSequelize(await database());
    const app = createApp({
      sequelize: state.sequelize,
      logger: pino({ level: 'silent' }),
      clientDir: '/nowhere',
      rateLimitScale: GENEROUS,
      proxies: 0,
      surroundings: {
        files: folderStore(files),
        address: () => ADDRESS,
        mailsAreShown: true,
        mailWaits: () => {},
      },
      ...changes,
    });
    const server = createServer(app);
    state.server = server;
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    state.url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`; // TCP, so never a path
  });

  beforeEach(() => {
    vi.spyOn(console, 'error');
    vi.spyOn(console, 'warn');
  });

  afterEach(() => {
    expect(console.error).not.toHaveBeenCalled();
    expect(console.warn).not.toHaveBeenCalled();
    vi.restoreAllMocks();
  });

  afterAll(async () => {
    await new Promise((resolve) => running(state.server).close(resolve));
    await running(state.sequelize).close();
    rmSync(files, { recursive: true });
  });

  return {
    get url() {
      return running(state.url);
    },
    get sequelize() {
      return running(state.sequelize);
    },
    files,
    visitor: () => request.agent(running(state.url)),
  };
}
