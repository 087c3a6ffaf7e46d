import { createHash } from 'node:crypto';
import type { IncrementResponse, Options, Store } from 'express-rate-limit';
import { QueryTypes, type Sequelize } from 'sequelize';

interface CounterRow {
  hits: number;
  resets_at: Date;
}

/** Counts requests in the database, so that every copy of the server counts together. Names are hashed. */
export class DatabaseCounters implements Store {
  readonly localKeys = false;
  readonly prefix: string;
  readonly #sequelize: Sequelize;
  #windowMs = 60_000;

  constructor(sequelize: Sequelize, prefix: string) {
    this.#sequelize = sequelize;
    this.prefix = prefix;
  }

  init(options: Options): void {
    this.#windowMs = options.windowMs;
  }

  async increment(key: string): Promise<IncrementResponse> {
    const [row] = await this.#sequelize.query<CounterRow>(
      `INSERT INTO rate_counters AS counter (name, hits, resets_at)
       VALUES ($1, 1, now() + $2 * interval '1 millisecond')
       ON CONFLICT (name) DO UPDATE SET
         hits = CASE WHEN counter.resets_at <= now() THEN 1 ELSE counter.hits + 1 END,
         resets_at = CASE WHEN counter.resets_at <= now() THEN excluded.resets_at ELSE counter.resets_at END
       RETURNING hits, resets_at`,
      { type: QueryTypes.SELECT, bind: [this.#name(key), this.#windowMs] },
    );
    return { totalHits: row?.hits ?? 1, resetTime: row?.resets_at };
  }

  async decrement(key: string): Promise<void> {
    const sql = 'UPDATE rate_counters SET hits = hits - 1 WHERE name = $1 AND hits > 0';
    // Called after the answer has gone, where nobody could catch; one count too many does no harm.
    await this.#sequelize.query(sql, { bind: [this.#name(key)] }).catch(() => undefined);
  }

  async resetKey(key: string): Promise<void> {
    await this.#sequelize.query('DELETE FROM rate_counters WHERE name = $1', { bind: [this.#name(key)] });
  }

  #name(key: string): string {
    return createHash('sha256').update(`${this.prefix}:${key}`).digest('hex');
  }
}
