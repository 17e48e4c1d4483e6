import { createTransport } from 'nodemailer';
import type { Logger } from './logger.ts';

/** A plain letter. */
export interface Letter {
  readonly to: readonly string[];
  readonly subject: string;
  readonly text: string;
}

/** Hands letters to the mail server; never rejects, because a dead mail server must stop no work. */
export type Mailer = (letter: Letter) => Promise<void>;

const timeoutMs = 10_000;

/** A mailer on the mail server at `smtpUrl` (`smtp://` or `smtps://`); without one, letters are only noted in the log. */
export const createMailer = (smtpUrl: string | undefined, logger: Logger): Mailer => {
  if (smtpUrl === undefined) {
    return ({ subject }) => {
      logger.info('No mail server is set (SMTP_URL), so a notice was not sent.', { subject });
      return Promise.resolve();
    };
  }
  const { hostname } = new URL(smtpUrl);
  const transport = createTransport(
    { url: smtpUrl, connectionTimeout: timeoutMs, socketTimeout: timeoutMs },
    { from: `Ladlemark <ladlemark@${hostname}>` },
  );
  return async (letter) => {
    try {
      await transport.sendMail({ ...letter, to: [...letter.to] });
    } catch (error) {
      logger.warn('A notice could not be handed to the mail server.', {
        subject: letter.subject,
        error: String(error),
      });
    }
  };
};
