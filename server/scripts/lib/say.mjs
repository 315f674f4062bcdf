/** One plain sentence on the terminal. */
export function say(sentence) {
  process.stdout.write(`${sentence}\n`);
}

/** An end with words instead of a stack trace. */
export class PlainError extends Error {}

export function explain(error) {
  if (error instanceof PlainError) return error.message;
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
