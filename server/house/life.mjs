import { wording } from './messages.mjs';
import { endChildren } from './run.mjs';

/** @type {Array<() => unknown>} */
const endings = [];
/** @type {Promise<never> | undefined} */
let ending;

/** Something to do before the house ends, whatever ends it; the last one given is done first. @param {() => unknown} step */
export const atEnd = (step) => endings.push(step);

export const isEnding = () => ending !== undefined;

/** @param {number} code @returns {Promise<never>} */
export function end(code) {
  ending ??= (async () => {
    let result = code;
    await endChildren();
    for (const step of endings.toReversed()) {
      try {
        await step();
      } catch (error) {
        console.error(wording(error));
        result ||= 1;
      }
    }
    process.exit(result);
  })();
  return ending;
}

/**
 * Runs a command of the house. One Ctrl-C reaches us twice, from the terminal and from npm, so every signal
 * after the first is ignored: an ending that has begun is finished.
 * @param {() => Promise<number>} command answers with the exit code
 * @param {() => number} [interrupted] the exit code after a signal
 */
export function live(command, interrupted = () => 130) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void end(interrupted()));
  watchParent(() => void end(interrupted()));
  command().then(end, (error) => {
    if (!isEnding()) console.error(wording(error));
    return end(1);
  });
}

/** An npm that is killed outright passes no signal on, but its child gets another parent. @param {() => void} orphaned */
function watchParent(orphaned) {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && orphaned(), 500).unref();
}
