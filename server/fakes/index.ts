import { startMailFake } from "./mail.ts";
import { startSignInFake } from "./sign-in.ts";

/** Starts both stand-ins and tells their addresses on one line of standard output. */
if (process.env.NODE_ENV === "production") {
  process.stderr.write("The stand-ins cannot be used in production.\n");
  process.exit(1);
}
const signIn = await startSignInFake();
const mail = await startMailFake();
process.stdout.write(
  `ready ${JSON.stringify({ signInUrl: signIn.url, smtpUrl: mail.smtpUrl, mailUrl: mail.url })}\n`,
);

async function stop(): Promise<void> {
  await Promise.all([signIn.close(), mail.close()]);
  process.exit(0);
}
process.once("SIGTERM", stop);
process.once("SIGINT", stop);
