export interface Postgres {
  /** The folder of the programs. */
  bin: string;
  major: number;
}

export interface ClusterOptions {
  /** The folder that holds the cluster; a throw-away one makes its own in the system's temporary folder. */
  home?: string;
  /** Deleted when stopped, also when the process that started it dies; not safe against a power cut, so faster. */
  throwaway?: boolean;
}

export interface Cluster {
  port: number;
  /**
   * The address of a database for the role `featherbeam`, which owns the database `featherbeam` (the default)
   * and may create others: connect to `postgres` for that.
   */
  url: (database?: string) => string;
  /** Stops the server; a second call waits for the first. */
  stop: () => Promise<void>;
}

/** PostgreSQL's server programs, 15 or newer and the newest there are, or those of one major version. */
export function findPostgres(major?: number): Postgres | null;

/**
 * Starts a PostgreSQL cluster of our own on a free port of 127.0.0.1 with passwords, made on the first start.
 * Throws an Error with one sentence when PostgreSQL is missing or does not start.
 */
export function startCluster(options: ClusterOptions): Promise<Cluster>;
