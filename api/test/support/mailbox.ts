import type { AddressInfo } from 'node:net';
import { type ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';

type Refusal = { code: number; message: string };

/** A real SMTP server on a port of its own that keeps what it accepts, parsed as a mail program would parse it. */
export class Mailbox {
  readonly mails: ParsedMail[] = [];
  /** What it answers to a recipient or to a message; taken off the list one by one, then it accepts. */
  readonly recipientRefusals: Refusal[] = [];
  readonly messageRefusals: Refusal[] = [];
  private server: SMTPServer | undefined;
  private lastPort = 0;

  get port(): number {
    return this.lastPort;
  }

  async open(): Promise<void> {
    const server = new SMTPServer({
      authOptional: true,
      disabledCommands: ['AUTH', 'STARTTLS'],
      onRcptTo: (_address, _session, done) => done(refusalAsError(this.recipientRefusals.shift())),
      onData: (stream, _session, done) => {
        simpleParser(stream, (fault, mail) => {
          if (fault) return done(fault);
          const refusal = refusalAsError(this.messageRefusals.shift());
          if (!refusal) this.mails.push(mail);
          return done(refusal);
        });
      },
    });
    // Refusals are what these tests provoke.
    server.on('error', () => undefined);
    await new Promise<void>((resolve) => server.listen(this.lastPort, '127.0.0.1', () => resolve()));
    this.lastPort = (server.server.address() as AddressInfo).port;
    this.server = server;
  }

  async close(): Promise<void> {
    const { server } = this;
    this.server = undefined;
    if (server) await new Promise<void>((resolve) => server.close(() => resolve()));
  }

  empty(): void {
    this.mails.length = 0;
  }
}

function refusalAsError(refusal: Refusal | undefined): Error | null {
  return refusal ? Object.assign(new Error(refusal.message), { responseCode: refusal.code }) : null;
}
