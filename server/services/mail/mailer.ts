import { connect, type Socket } from 'node:net';
import { createTransport, type Transporter } from 'nodemailer';
import type { SMTPError } from 'nodemailer/lib/smtp-connection';
import { z } from 'zod';
import { oneLine, type Mail } from './letter';

/** How and as whom mail is sent. */
export interface MailSettings {
  /** `smtp://` or `smtps://`, with user and password where the server wants them. */
  readonly smtpUrl: string;
  /** Address of the sender. */
  readonly from: string;
}

/** The mail was not taken. */
export class Undelivered extends Error {
  constructor(
    reason: string,
    /** Trying again would not help. */
    readonly isFinal: boolean,
  ) {
    super(reason);
  }
}

/** What sends one mail; throws `Undelivered` where it was not taken. */
export interface Mailer {
  readonly send: (mail: Mail, id: string) => Promise<void>;
  /** Breaks off what is under way. */
  readonly close: () => void;
}

const idleMs = 15_000;
/** Well within the two minutes after which a mail is due again. */
const mostMs = 60_000;
const impliedPorts: Readonly<Record<string, number>> = { 'smtp:': 587, 'smtps:': 465 };
const isLoopback = (host: string) => /^(localhost|127\.\d+\.\d+\.\d+|\[::1\])$/.test(host);

/** A refusal for good is one of the recipient or the text; sender and sign-in can be put right. */
function undelivered(error: unknown): Undelivered {
  const { command, responseCode = 0, message } = error as Partial<SMTPError>;
  const isAboutMail = command === 'RCPT TO' || command === 'DATA';
  return new Undelivered(message ?? String(error), isAboutMail && responseCode >= 500);
}

/** Sends by SMTP, a connection a mail; encrypted (STARTTLS or TLS) wherever it leaves this machine. */
export class SmtpMailer implements Mailer {
  private readonly transport: Transporter;
  private readonly sockets = new Set<Socket>();
  private readonly domain: string;

  constructor(private readonly settings: MailSettings) {
    const { protocol, hostname, port, username, password } = new URL(settings.smtpUrl);
    const host = hostname.replace(/^\[|\]$/g, '');
    this.domain = settings.from.slice(settings.from.lastIndexOf('@') + 1);
    const at = Number(port) || impliedPorts[protocol] || 25;
    this.transport = createTransport({
      host,
      port: at,
      secure: protocol === 'smtps:',
      requireTLS: !isLoopback(hostname),
      ...(username && {
        auth: { user: decodeURIComponent(username), pass: decodeURIComponent(password) },
      }),
      greetingTimeout: idleMs,
      socketTimeout: idleMs,
      disableFileAccess: true,
      disableUrlAccess: true,
      getSocket: (_options, callback) => this.open(host, at, callback),
    });
  }

  /** The id makes the Message-ID: a mail that comes twice after a crash can be told to be one. */
  async send({ to, subject, text }: Mail, id: string): Promise<void> {
    // An address is never parsed as a list, and what is none never reaches a header.
    if (!z.email().safeParse(to).success) throw new Undelivered('not an address', true);
    try {
      await this.transport.sendMail({
        from: { name: 'Stepwell', address: this.settings.from },
        to: { name: '', address: to },
        subject: oneLine(subject),
        text,
        messageId: `<${id}@${this.domain}>`,
        headers: { 'Auto-Submitted': 'auto-generated' },
      });
    } catch (error) {
      throw undelivered(error);
    }
  }

  close(): void {
    for (const socket of this.sockets) socket.destroy();
  }

  /** A connection that ends in time whatever the other side does. */
  private open(
    host: string,
    port: number,
    callback: (error: Error | null, options: object) => void,
  ): void {
    const socket = connect({ host, port });
    this.sockets.add(socket);
    const end = (reason: string) => socket.destroy(new Error(reason));
    const connecting = setTimeout(end, idleMs, 'The server cannot be reached in time');
    const deadline = setTimeout(end, mostMs, 'The server took too long');
    const fail = (error: Error) => callback(error, {});
    socket
      .once('close', () => {
        clearTimeout(connecting);
        clearTimeout(deadline);
        this.sockets.delete(socket);
      })
      .once('error', fail)
      .once('connect', () => {
        clearTimeout(connecting);
        socket.off('error', fail);
        callback(null, { connection: socket });
      });
  }
}
