import type { AddressInfo } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import { nextMode, type MailBehaviour } from './mail-behaviour';
import type { MailBox } from './mail-box';

const SIZE_LIMIT_BYTES = 10 * 1024 * 1024;

/** The running mail server. */
export interface MailServer {
  readonly port: number;
  close(): Promise<void>;
}

const reply = (responseCode: number, text: string): Error => Object.assign(new Error(text), { responseCode });

const readAll = async (stream: SMTPServerDataStream): Promise<Buffer> => {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(chunk as Buffer);
  return Buffer.concat(chunks);
};

/** The session's socket, to break the connection with; not part of the library's types. */
const breakOff = (server: SMTPServer, session: SMTPServerSession): void => {
  for (const connection of (
    server as unknown as { connections: Set<{ id: string; close(): void; _socket?: { destroy(): void } }> }
  ).connections)
    if (connection.id === session.id) connection._socket?.destroy();
};

/**
 * An SMTP server on 127.0.0.1 that keeps what it gets in the box and never sends anything on. It answers as the
 * behaviour orders: 550 (refuse), 451 (error), late (slow), or keeps the message and breaks the connection before
 * the answer (drop), which is how a sender comes to send the same message twice.
 */
export const startMailServer = async (
  box: MailBox,
  behaviour: MailBehaviour,
  port: number,
): Promise<MailServer> => {
  const take = async (stream: SMTPServerDataStream, session: SMTPServerSession): Promise<string> => {
    const raw = await readAll(stream);
    if (stream.sizeExceeded) throw reply(552, `5.3.4 The message is larger than ${SIZE_LIMIT_BYTES} bytes`);
    const mode = nextMode(behaviour);
    if (mode === 'refuse') throw reply(550, '5.7.1 Refused, as told');
    if (mode === 'error') throw reply(451, '4.3.0 Out of order, as told');
    if (mode === 'slow') await pause(behaviour.delayMs);
    const from = session.envelope.mailFrom ? session.envelope.mailFrom.address : '';
    const n = await box.keep(
      from,
      session.envelope.rcptTo.map((one) => one.address),
      raw,
    );
    if (mode === 'drop') breakOff(server, session);
    return `2.0.0 Kept as ${n}`;
  };

  const server: SMTPServer = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS', 'AUTH'],
    size: SIZE_LIMIT_BYTES,
    disableReverseLookup: true,
    logger: false,
    onRcptTo(address, _session, done) {
      const code = behaviour.recipients[address.address.toLowerCase()];
      done(code ? reply(code, code >= 500 ? '5.1.1 No such mailbox' : '4.2.2 Mailbox not ready') : null);
    },
    onData(stream, session, done) {
      take(stream, session).then((text) => done(null, text as never), done);
    },
  });
  server.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'ECONNRESET' && error.code !== 'EPIPE') console.error(`Mail server: ${error.message}`);
  });
  await new Promise<void>((resolve, reject) => {
    server.server.once('error', reject);
    server.listen(port, '127.0.0.1', resolve);
  });
  return {
    port: (server.server.address() as AddressInfo).port,
    close: () => new Promise((resolve) => server.close(resolve)),
  };
};
