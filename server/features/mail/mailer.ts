import { createTransport } from "nodemailer";
import type { Logger } from "pino";
import type { Config } from "../../config.ts";

export interface Letter {
  to: string;
  subject: string;
  text: string;
}

/** Letters written during a request; `deliver` sends them once the request's changes are kept. */
export interface Mailer {
  write(letter: Letter): void;
}

export interface Outbox extends Mailer {
  deliver(): void;
}

export interface Mail {
  open(): Outbox;
  close(): void;
}

/** Sends through any SMTP service. A letter that cannot be sent is logged and never breaks the request it belongs to. */
export function createMail(config: Config, log: Logger): Mail {
  const transport = createTransport(config.mail.smtpUrl, {
    from: config.mail.from,
    ...(config.mail.fakeUrl === null ? {} : { ignoreTLS: true }),
  });
  return {
    open() {
      const letters: Letter[] = [];
      return {
        write: (letter) => letters.push(letter),
        deliver() {
          for (const letter of letters.splice(0)) {
            transport
              .sendMail(letter)
              .catch((error: Error) =>
                log.error({ reason: error.message, subject: letter.subject }, "letter not sent"),
              );
          }
        },
      };
    },
    close: () => transport.close(),
  };
}
