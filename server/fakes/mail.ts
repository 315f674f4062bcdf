import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { SMTPServer } from "smtp-server";

/** How many letters are kept; the oldest go first. */
const KEPT = 100;

export interface KeptMail {
  from: string;
  to: string[];
  raw: string;
  receivedAt: string;
}

function portOf(server: { address(): unknown }): number {
  return (server.address() as AddressInfo).port;
}

/** Stands in for a mail service on loopback: keeps the last letters in memory and shows them as JSON on a small address. */
export async function startMailFake(): Promise<{
  smtpUrl: string;
  url: string;
  mails: KeptMail[];
  close(): Promise<void>;
}> {
  const mails: KeptMail[] = [];
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    onData(stream, session, callback) {
      let raw = "";
      stream.setEncoding("utf8");
      stream.on("data", (part: string) => {
        raw += part;
      });
      stream.on("end", () => {
        const from = session.envelope.mailFrom;
        mails.push({
          from: from === false ? "" : from.address,
          to: session.envelope.rcptTo.map((recipient) => recipient.address),
          raw,
          receivedAt: new Date().toISOString(),
        });
        if (mails.length > KEPT) mails.shift();
        callback();
      });
    },
  });
  const page = createServer((_request, response) => {
    response.setHeader("content-type", "application/json; charset=utf-8");
    response.end(JSON.stringify(mails, null, 2));
  });
  await new Promise<void>((resolve) => smtp.listen(0, "127.0.0.1", resolve));
  await new Promise<void>((resolve) => page.listen(0, "127.0.0.1", resolve));
  return {
    smtpUrl: `smtp://127.0.0.1:${portOf(smtp.server)}`,
    url: `http://127.0.0.1:${portOf(page)}`,
    mails,
    close: async () => {
      await new Promise<void>((resolve) => smtp.close(() => resolve()));
      await new Promise<void>((resolve) => page.close(() => resolve()));
    },
  };
}
