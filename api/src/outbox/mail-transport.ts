import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport, type Transporter } from 'nodemailer';
import { env } from '../config/env';
import { oneLine } from './one-line';

export type OutgoingMail = { to: string; subject: string; html: string; text: string; messageId: string };

export type SmtpServer = { host: string; port: number; secure: boolean; user: string; password: string };

export const smtpServer = (): SmtpServer => ({
  host: env.SMTP_HOST,
  port: env.SMTP_PORT,
  secure: env.SMTP_SECURE,
  user: env.SMTP_USER,
  password: env.SMTP_PASSWORD,
});

/** Hands one mail to the SMTP server. */
@Injectable()
export class MailTransport implements OnApplicationShutdown {
  private readonly transport: Transporter;

  constructor({ host, port, secure, user, password }: SmtpServer) {
    this.transport = createTransport({
      host,
      port,
      secure,
      // A password never travels in the clear.
      ...(user === '' ? {} : { auth: { user, pass: password }, requireTLS: !secure }),
      connectionTimeout: 10_000,
      greetingTimeout: 10_000,
      socketTimeout: 30_000,
      disableFileAccess: true,
      disableUrlAccess: true,
    });
  }

  async send({ to, subject, html, text, messageId }: OutgoingMail): Promise<void> {
    await this.transport.sendMail({
      from: env.SMTP_FROM,
      to: { name: '', address: oneLine('address', to) },
      subject: oneLine('subject', subject),
      html,
      text,
      messageId: oneLine('message id', messageId),
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
  }

  onApplicationShutdown(): void {
    this.transport.close();
  }
}
