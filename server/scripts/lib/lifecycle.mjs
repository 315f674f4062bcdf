import { stopAll } from "./children.mjs";
import { explain } from "./say.mjs";

/**
 * Runs `main` with a list of things to undo. Whatever ends the script (Ctrl-C, a signal, an error, the end of the npm process
 * that called it) undoes them in reverse order, once.
 */
export function withCleanUp(main) {
  const undo = [];
  let ending = null;
  const end = (code) => {
    ending ??= (async () => {
      for (const step of undo.reverse()) await step().catch(() => {});
      await stopAll();
      process.exit(code);
    })();
    return ending;
  };
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"])
    process.on(signal, () => end(signal === "SIGINT" ? 130 : 143));
  watchParent(() => end(143));
  main({ onEnd: (step) => undo.push(step), end, ending: () => ending !== null }).catch((error) => {
    if (ending === null) process.stderr.write(`${explain(error)}\n`);
    end(1);
  });
}

/** npm does not hand a TERM on to the script it started; the script sees it by having got another parent. */
function watchParent(gone) {
  if (process.env.npm_lifecycle_event === undefined) return;
  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent) gone();
  }, 500).unref();
}
