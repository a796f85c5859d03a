import nodemailer from 'nodemailer';
import type { Config } from '../config.ts';

export interface Letter {
  from: { name: string; address: string };
  to: string;
  subject: string;
  text: string;
  /** The same for each try to send the same mail. */
  messageId: string;
  attachments: { filename: string; contentType: string; content: Buffer }[];
}

export interface Mailer {
  /** False while no mail server is set: papers are then handed over by hand. */
  readonly available: boolean;
  send(letter: Letter): Promise<void>;
}

/** Mail goes out by SMTP to wherever SMTP_URL says. */
export function connectMail(config: Config): Mailer {
  if (config.smtpUrl === undefined) {
    return {
      available: false,
      send: () => Promise.reject(new Error('No mail server is set (SMTP_URL)')),
    };
  }
  const transport = nodemailer.createTransport({
    url: config.smtpUrl,
    connectionTimeout: 10_000,
    socketTimeout: 30_000,
  });
  return {
    available: true,
    async send(letter) {
      await transport.sendMail({ ...letter, disableFileAccess: true, disableUrlAccess: true });
    },
  };
}
