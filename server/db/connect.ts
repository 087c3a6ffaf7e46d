import type { Sequelize } from 'sequelize';
import { failureOf } from './failure.ts';

/** The database cannot be used; the message is a sentence for whoever started the program. */
export class DatabaseUnusable extends Error {}

/** What no waiting will mend, by SQLSTATE. */
const HOPELESS: Record<string, string> = {
  '28P01': 'The database refuses the password in DATABASE_URL.',
  '28000': 'The database does not let this user in. Check the user in DATABASE_URL.',
  '3D000': 'The database named in DATABASE_URL does not exist. Create it, or correct the name.',
};

/**
 * Waits until the database answers.
 * @throws DatabaseUnusable when it does not within `patienceMs`, or when waiting is hopeless
 */
export async function connect(sequelize: Sequelize, patienceMs = 30_000): Promise<void> {
  const givesUpAt = Date.now() + patienceMs;
  for (let pause = 100; ; pause = Math.min(pause * 2, 2_000)) {
    try {
      await sequelize.query('SELECT 1');
      return;
    } catch (error) {
      const hopeless = HOPELESS[failureOf(error).sqlState ?? ''];
      if (hopeless) throw new DatabaseUnusable(hopeless);
      if (Date.now() + pause > givesUpAt) {
        const seconds = Math.round(patienceMs / 1000);
        throw new DatabaseUnusable(
          `The database did not answer for ${seconds} s. Check that PostgreSQL runs where DATABASE_URL points.`,
        );
      }
    }
    await new Promise((resolve) => setTimeout(resolve, pause));
  }
}
