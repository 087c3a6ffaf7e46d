import { useCallback, useEffect, useId, useState } from 'react';
import { drawer } from './drawer.ts';
import type { AnswerOf, DrawTask } from './tasks.ts';

/** How far the drawing of a task has come, and the newest answer there is. */
export interface Drawing<Task extends DrawTask> {
  /** of the task asked, or of the one before while `working`; null before the first */
  answer: AnswerOf<Task> | null;
  /** the answer is of the task asked */
  fresh: boolean;
  working: boolean;
  /** 0–1, of the task that is worked on */
  done: number;
  /** why it could not be drawn */
  problem: string | null;
  /** called off by the reader */
  stopped: boolean;
  stop: () => void;
  /** draws again after a stop or a failure */
  resume: () => void;
}

interface Held<Task extends DrawTask> {
  /** whose progress, stop and failure this is */
  of: Task | null;
  done: number;
  problem: string | null;
  stopped: boolean;
  answer: AnswerOf<Task> | null;
  answered: Task | null;
}

/**
 * Draws a task in the worker; a new one takes the place of what is still being drawn. Hand in the same object as long
 * as nothing is asked anew; null asks nothing.
 */
export function useDrawing<Task extends DrawTask>(task: Task | null): Drawing<Task> {
  const subject = useId();
  const [held, setHeld] = useState<Held<Task>>({
    of: null,
    done: 0,
    problem: null,
    stopped: false,
    answer: null,
    answered: null,
  });
  const [round, setRound] = useState(0);

  useEffect(() => {
    if (!task) return;
    drawer.ask(subject, task, (reply) => {
      if (reply.type === 'answer') {
        // What comes back to a subject is of the kind that it asked for.
        const answer = reply.answer as AnswerOf<Task>;
        setHeld({ of: task, done: 1, problem: null, stopped: false, answer, answered: task });
        return;
      }
      const done = reply.type === 'progress' ? reply.done : 0;
      const problem = reply.type === 'failed' ? reply.problem : null;
      setHeld((before) => ({ ...before, of: task, done, problem, stopped: false }));
    });
    return () => drawer.cancel(subject);
  }, [subject, task, round]);

  const stop = useCallback(() => {
    drawer.cancel(subject);
    setHeld((before) => ({ ...before, of: task, stopped: true }));
  }, [subject, task]);
  const resume = useCallback(() => {
    setHeld((before) => ({ ...before, of: task, done: 0, problem: null, stopped: false }));
    setRound((n) => n + 1);
  }, [task]);

  const own = held.of === task;
  const fresh = task !== null && held.answered === task;
  const [problem, stopped] = own ? [held.problem, held.stopped] : [null, false];
  return {
    answer: task === null ? null : held.answer,
    fresh,
    working: task !== null && !fresh && !stopped && problem === null,
    done: own ? held.done : 0,
    problem,
    stopped,
    stop,
    resume,
  };
}
