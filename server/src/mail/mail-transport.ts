import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';

const LOOPBACK = new Set(['127.0.0.1', 'localhost', '[::1]']);

/** How the mail server is reached: in clear only on this machine. */
export function transportOptions(smtpUrl: string) {
  const address = new URL(smtpUrl);
  const isLocal = LOOPBACK.has(address.hostname);
  const secure = address.protocol === 'smtps:';
  return {
    host: address.hostname.replace(/^\[|\]$/g, ''),
    port: Number(address.port || (secure ? 465 : 587)),
    secure,
    ignoreTLS: isLocal && !secure,
    requireTLS: !isLocal && !secure,
    ...(address.username
      ? {
          auth: {
            user: decodeURIComponent(address.username),
            pass: decodeURIComponent(address.password),
          },
        }
      : {}),
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  };
}

/** Hands mails to the mail server. Tests put their own in its place. */
@Injectable()
export class MailTransport implements OnApplicationShutdown {
  private readonly transporter: Transporter;

  constructor(@Inject(CONFIG) config: Config) {
    this.transporter = createTransport(transportOptions(config.SMTP_URL));
  }

  async send(mail: SendMailOptions): Promise<void> {
    await this.transporter.sendMail(mail);
  }

  onApplicationShutdown(): void {
    this.transporter.close();
  }
}
