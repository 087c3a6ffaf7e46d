import { realpathSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

/** Whether a module was started as the program, and not imported by another. */
export function isMainModule(moduleUrl: string): boolean {
  const started = process.argv[1];
  return started !== undefined && realpathSync(started) === fileURLToPath(moduleUrl);
}
