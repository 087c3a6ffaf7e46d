import { randomUUID } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import { SMTPServer } from 'smtp-server';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { employPostman, sendNext, smtpSender, type Postman, type Send } from '#server/mail/delivery.ts';
import { Mail } from '#server/models/mail.ts';
import { bindSurroundings, surroundings } from '#server/surroundings.ts';
import { useApp } from '../support/app.ts';

const app = useApp();

/** A mail server that keeps what it is sent. */
async function mailServer(port = 0) {
  const arrived: string[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      let text = '';
      stream.on('data', (piece: Buffer) => (text += piece.toString('utf8')));
      stream.on('end', () => {
        arrived.push(text);
        done();
      });
    },
  });
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  const { port: own } = server.server.address() as AddressInfo; // TCP
  const stop = () => new Promise<void>((resolve) => server.close(() => resolve()));
  return { arrived, port: own, stop };
}

const write = (subject: string) =>
  Mail.create({
    id: randomUUID(),
    to: 'quill@larkmoor.example',
    subject,
    text: 'Grüße',
    html: '<p>Grüße</p>',
    dueAt: new Date(),
  });
const sender = (port: number): Send =>
  smtpSender(`smtp://127.0.0.1:${port}`, 'Featherbeam <post@larkmoor.example>');

const employed: Postman[] = [];
afterEach(async () => {
  await Promise.all(employed.splice(0).map(({ stop }) => stop()));
  await Mail.destroy({ where: {} });
});
const employ = (send: Send) => {
  const postman = employPostman(send, (error) => expect.fail(String(error)));
  employed.push(postman);
  return postman;
};

describe('the post', () => {
  it('sends what was written, once, and then forgets its words', async () => {
    const server = await mailServer();
    const mail = await write('Confirm your address');
    employ(sender(server.port));
    await vi.waitFor(() => expect(server.arrived).toHaveLength(1), { timeout: 10_000 });
    expect(server.arrived[0]).toContain('Subject: Confirm your address');
    expect(server.arrived[0]).toContain(`Message-ID: <${mail.id}@larkmoor.example>`);
    await vi.waitFor(async () => expect((await mail.reload()).sentAt).not.toBeNull());
    expect(mail).toMatchObject({ text: '', html: '', dueAt: null });
    await server.stop();
  });

  it('sends each mail once though several servers go round at once', async () => {
    const server = await mailServer();
    await Promise.all(Array.from({ length: 12 }, (_, i) => write(`Number ${i}`)));
    const send = sender(server.port);
    for (const _ of [1, 2, 3]) employ(send);
    await vi.waitFor(() => expect(server.arrived).toHaveLength(12), { timeout: 15_000 });
    await Promise.all(employed.splice(0).map(({ stop }) => stop()));
    expect(server.arrived).toHaveLength(12);
    await server.stop();
  });

  it('waits for a mail server that is away and sends when it is back', async () => {
    const first = await mailServer();
    const { port } = first;
    await first.stop();
    const mail = await write('Later');
    expect(await sendNext(sender(port))).toBe(true);
    await mail.reload();
    expect(mail).toMatchObject({ attempts: 1, sentAt: null });
    expect(mail.lastError).toMatch(/ECONNREFUSED/);
    expect(mail.dueAt?.getTime()).toBeGreaterThan(Date.now() + 30_000);
    const back = await mailServer(port);
    await mail.update({ dueAt: new Date() });
    employ(sender(port));
    await vi.waitFor(() => expect(back.arrived).toHaveLength(1), { timeout: 10_000 });
    await back.stop();
  });

  it('gives a mail up after the last try, and keeps why', async () => {
    const mail = await write('Never');
    const refuse: Send = () => Promise.reject(new Error('550 no such mailbox'));
    for (let attempt = 1; attempt <= 10; attempt++) {
      await mail.update({ dueAt: new Date() });
      await sendNext(refuse);
      await mail.reload();
    }
    expect(mail).toMatchObject({ attempts: 10, dueAt: null, lastError: '550 no such mailbox' });
    expect(await sendNext(refuse)).toBe(false);
  });

  it('is woken when the transaction that wrote a mail is kept, and not before', async () => {
    const around = surroundings();
    const woken = vi.fn<() => void>();
    bindSurroundings({ ...around, mailsAreShown: false, mailWaits: woken });
    try {
      const email = `new.${randomUUID()}@larkmoor.example`;
      const body = { name: 'New', email, password: 'spruce over the ridge' };
      await app.visitor().post('/api/users').send(body).expect(201);
      expect(woken).toHaveBeenCalledTimes(1);
      expect(await Mail.findOne({ where: { to: email } })).toMatchObject({ attempts: 0, sentAt: null });
      await app.visitor().get('/api/dev/mails').expect(404);
    } finally {
      bindSurroundings(around);
    }
  });
});
