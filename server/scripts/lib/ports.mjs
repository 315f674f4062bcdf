import { createServer } from "node:net";

/** Resolves with true when nothing listens on this loopback port. Port 0 asks the system for any. */
function tryPort(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(null));
    server.listen({ port, host: "127.0.0.1", exclusive: true }, () => {
      const { port: taken } = server.address();
      server.close(() => resolve(taken));
    });
  });
}

/** The wished port when it is free, else any free one. */
export async function freePort(wished = 0) {
  const taken = wished === 0 ? null : await tryPort(wished);
  return taken ?? (await tryPort(0));
}
