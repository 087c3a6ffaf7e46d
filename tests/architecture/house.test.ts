import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { findPostgres } from '#server/house/cluster.mjs';
import { demoLines } from '#server/house/demo.mjs';
import { explain, HouseError, wording } from '#server/house/messages.mjs';
import { homeFor } from '#server/house/paths.mjs';
import { closingLine, countReport, type Report } from '#server/house/test-report.mjs';
import { importsOf, sourcesIn } from './sources.ts';

const report = (changes: Partial<Report> = {}): Report => ({
  numPassedTests: 7,
  numFailedTests: 0,
  numPendingTests: 0,
  numTodoTests: 0,
  testResults: [{ status: 'passed', assertionResults: [{ status: 'passed' }] }],
  ...changes,
});

describe('the count that closes npm test', () => {
  it('is one line of two numbers', () => {
    expect(closingLine({ passed: 412, failed: 3 })).toBe('412 passed, 3 failed');
  });

  it('takes over what passed and what failed', () => {
    expect(countReport(report(), 0)).toEqual({ passed: 7, failed: 0 });
    const one = { status: 'failed', assertionResults: [{ status: 'failed' }] };
    expect(countReport(report({ numFailedTests: 1, testResults: [one] }), 1)).toEqual({
      passed: 7,
      failed: 1,
    });
  });

  it('counts a file that does not load as a failure', () => {
    const unloaded = { status: 'failed', assertionResults: [] };
    expect(countReport(report({ testResults: [unloaded, unloaded] }), 1)).toEqual({ passed: 7, failed: 2 });
  });

  it('counts a skipped test, and one still to write, as failures', () => {
    expect(countReport(report({ numPendingTests: 2, numTodoTests: 1 }), 0)).toEqual({ passed: 7, failed: 3 });
  });

  it('is never without failures when the runner was unhappy, wrote nothing or ran nothing', () => {
    expect(countReport(report(), 1)).toEqual({ passed: 7, failed: 1 });
    expect(countReport(null, 0)).toEqual({ passed: 0, failed: 1 });
    expect(countReport(report({ numPassedTests: 0, testResults: [] }), 0)).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the sentence for a failure', () => {
  it('says that the disk is full, whichever program found out', () => {
    const words = [
      'npm error code ENOSPC',
      'initdb: error: could not write: No space left on device',
      'HINT:  Check free disk space.',
      'Error: EDQUOT: disk quota exceeded, write',
    ];
    for (const said of words) expect(explain(said)).toMatch(/^The disk is full/);
  });

  it('tells an unreachable registry from any other failure of npm', () => {
    expect(explain('npm error code EAI_AGAIN', 'packages')).toMatch(/^The npm registry cannot be reached/);
    expect(explain('npm error code EAI_AGAIN')).toBeNull();
    expect(explain('npm error code EINTEGRITY', 'packages')).toBeNull();
  });

  it('tells an unreachable archive of Debian', () => {
    expect(explain("Err:1 Temporary failure resolving 'deb.debian.org'", 'debian')).toMatch(
      /^Debian’s package archive/,
    );
  });

  it('is the whole message of a failure that was foreseen, and the stack of one that was not', () => {
    expect(wording(new HouseError('Port 4310 is taken.'))).toBe('Port 4310 is taken.');
    expect(wording(new TypeError('x is not a function'))).toMatch(/TypeError: x is not a function\n\s+at /);
  });

  it('names a folder that may not be written', () => {
    const refused = Object.assign(new Error('EACCES: permission denied'), {
      code: 'EACCES',
      path: '/srv/gliders',
    });
    expect(wording(refused)).toBe('/srv/gliders cannot be read or written by this user.');
  });
});

describe('the home of a clone', () => {
  const clone = '/srv/featherbeam';
  const at = (env: Record<string, string>, asRoot = false, where = clone) =>
    homeFor({ env, clone: where, asRoot, userHome: '/home/ines' });

  it('is where FEATHERBEAM_HOME says', () => {
    expect(at({ FEATHERBEAM_HOME: '/data/fb' }, true)).toBe('/data/fb');
    expect(at({ FEATHERBEAM_HOME: '' })).not.toBe(clone);
  });

  it('lies in the user’s own folder, outside the clone, and another clone has another', () => {
    expect(at({})).toMatch(/^\/home\/ines\/\.local\/share\/featherbeam-[0-9a-f]{8}$/);
    expect(at({ XDG_DATA_HOME: '/home/ines/data' })).toMatch(/^\/home\/ines\/data\/featherbeam-[0-9a-f]{8}$/);
    expect(at({})).not.toBe(at({}, false, '/srv/other'));
  });

  it('of root lies where the user of PostgreSQL can reach it', () => {
    expect(at({}, true)).toMatch(/^\/var\/lib\/featherbeam\/[0-9a-f]{8}$/);
  });
});

describe('the demo sign-ins', () => {
  it('are one aligned line a person, with the admin marked', () => {
    const people = [
      { name: 'Ada', email: 'a@b.example', password: 'long-password', role: 'admin' },
      { name: 'Bo', email: 'long@b.example', password: 'short', role: 'user' },
    ];
    expect(demoLines({ people })).toEqual([
      'Demo sign-ins (e-mail, password):',
      '  a@b.example     long-password  Ada, admin',
      '  long@b.example  short          Bo',
    ]);
    expect(demoLines({ people: [] })).toEqual([]);
  });
});

describe('the search for PostgreSQL', () => {
  it('finds nothing of a version that never was', () => {
    expect(findPostgres(99_999)).toBeNull();
  });
});

describe('the scripts', () => {
  it('start, test and restore through the house, which runs before any package is there', () => {
    const { scripts } = JSON.parse(readFileSync('package.json', 'utf8'));
    for (const name of ['start', 'test', 'dev', 'check', 'bench', 'backup', 'restore', 'db:migrate']) {
      expect(scripts[name], name).toMatch(/^exec node server\/house\/[a-z]+\.mjs/);
    }
  });

  it('need nothing but Node’s own modules until packages are there', () => {
    const house = sourcesIn(['server/house'], /\.mjs$/);
    const foreign = house.flatMap((file) =>
      importsOf(file).filter(({ written }) => !/^(node:|\.\/[a-z-]+\.d?\.?m[jt]s$)/.test(written)),
    );
    expect(house.length).toBeGreaterThan(10);
    expect(foreign).toEqual([]);
  });
});
