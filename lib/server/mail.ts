import 'server-only';
import nodemailer from 'nodemailer';
import { env } from '@/lib/env';
import { AppError } from '@/lib/http/errors';
import { log } from './log';

export type Mail = {
  /** One bare address. */
  readonly to: string;
  readonly subject: string;
  /** Plain text: it reads the same everywhere, and nothing in a name can become a link or a picture. */
  readonly text: string;
};

const patience = { connectionTimeout: 5_000, greetingTimeout: 5_000, socketTimeout: 10_000 };

const oneLine = (text: string): string => text.replace(/[\p{C}\s]+/gu, ' ').trim();

/** Hands a mail to the mail server, or throws a refusal that says it was not sent. */
export const sendMail = async ({ to, subject, text }: Mail): Promise<void> => {
  const { SMTP_URL, MAIL_FROM } = env();
  if (SMTP_URL === undefined) throw new AppError('unavailable', 'Tamis has no mail server here, so no e-mail can be sent. Nothing was changed. Whoever looks after Tamis can set one.');
  const transport = nodemailer.createTransport({ url: SMTP_URL, ...patience });
  try {
    await transport.sendMail({ from: MAIL_FROM, to: { name: '', address: to }, subject: oneLine(subject), text });
  } catch (error) {
    log.error({ error: error instanceof Error ? error.message : String(error) }, 'a mail was not taken');
    throw new AppError('unavailable', `The mail server did not take the e-mail for ${to}. Nothing was changed. Look at the address, then try again.`, { retryAfterSeconds: 30 });
  } finally {
    transport.close();
  }
};
