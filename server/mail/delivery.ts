import { createTransport } from 'nodemailer';
import { Op, type Transaction } from 'sequelize';
import { Mail } from '#server/models/mail.ts';
import { inTransaction } from '#server/services/transaction.ts';

/** Sends one mail, or says by an error that it could not. */
export type Send = (mail: {
  id: string;
  to: string;
  subject: string;
  text: string;
  html: string;
}) => Promise<void>;

/** Sends over SMTP; the mail's own id stands in its head, so that one that arrives twice can be told. */
export function smtpSender(url: string, from: string): Send {
  const transport = createTransport(url, { from });
  const domain = /@([^>\s]+)/.exec(from)?.[1] ?? 'localhost';
  return async ({ id, to, subject, text, html }) => {
    await transport.sendMail({ to, subject, text, html, messageId: `<${id}@${domain}>` });
  };
}

/** Minutes until the next try; after the last the mail is given up. */
const WAITS = [1, 2, 5, 15, 60, 180, 360, 720, 1440];

/**
 * Sends the mail that is due for longest. Its row is locked meanwhile, so that of several servers one sends it.
 * @returns whether there was one
 */
export function sendNext(send: Send): Promise<boolean> {
  return inTransaction(async (transaction) => {
    const mail = await Mail.findOne({
      where: { dueAt: { [Op.lte]: new Date() } },
      order: [['dueAt', 'ASC']],
      lock: true,
      skipLocked: true,
      transaction,
    });
    if (!mail) return false;
    const { id, to, subject, text, html } = mail;
    try {
      await send({ id, to, subject, text, html });
      // A link that has left is nobody's to read here.
      await mail.update({ sentAt: new Date(), dueAt: null, text: '', html: '' }, { transaction });
    } catch (error) {
      await putOff(mail, error, transaction);
    }
    return true;
  });
}

async function putOff(mail: Mail, error: unknown, transaction: Transaction): Promise<void> {
  const wait = WAITS[mail.attempts];
  const lastError = (error instanceof Error ? error.message : String(error)).slice(0, 500);
  const dueAt = wait === undefined ? null : new Date(Date.now() + wait * 60_000);
  await mail.update({ attempts: mail.attempts + 1, lastError, dueAt }, { transaction });
}

export interface Postman {
  /** A mail was written: go now. */
  wake: () => void;
  /** Ends after the mail at hand. */
  stop: () => Promise<void>;
}

const ROUND_MS = 15_000;

/** Goes round for what is due, and at once when woken. A round that fails is told and the next one goes. */
export function employPostman(send: Send, failed: (error: unknown) => void): Postman {
  const state = { again: false, stopped: false };
  let round: Promise<void> | undefined;
  const go = async () => {
    do {
      state.again = false;
      try {
        while (!state.stopped && (await sendNext(send)));
      } catch (error) {
        failed(error);
      }
    } while (state.again && !state.stopped);
  };
  const wake = () => {
    state.again = true;
    if (state.stopped || round) return;
    round = go().finally(() => (round = undefined));
  };
  const timer = setInterval(wake, ROUND_MS);
  timer.unref();
  wake();
  return {
    wake,
    stop: async () => {
      state.stopped = true;
      clearInterval(timer);
      await round;
    },
  };
}
