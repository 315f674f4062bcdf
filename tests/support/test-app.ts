import { createServer, type Server } from "node:http";
import type { AddressInfo } from "node:net";
import type { Sequelize } from "sequelize";
import request, { type Response } from "supertest";
import { type App, createApp } from "../../server/app.ts";
import type { Config } from "../../server/config.ts";
import { startMailFake } from "../../server/fakes/mail.ts";
import { startSignInFake } from "../../server/fakes/sign-in.ts";
import { createLog } from "../../server/http/request-log.ts";
import { testConfig } from "./test-config.ts";
import { preparedDatabase } from "./test-database.ts";

type Method = "get" | "post" | "put" | "patch" | "delete";

/** A browser-like client: keeps its cookie and sends the token with every change. */
export interface Client {
  get(path: string): Promise<Response>;
  post(path: string, body?: unknown): Promise<Response>;
  put(path: string, body?: unknown): Promise<Response>;
  patch(path: string, body?: unknown): Promise<Response>;
  delete(path: string): Promise<Response>;
  send(method: Method, path: string, body?: unknown): Promise<Response>;
}

export interface TestApp {
  url: string;
  config: Config;
  sequelize: Sequelize;
  mails: Awaited<ReturnType<typeof startMailFake>>["mails"];
  /** Signs a person in through the whole redirect of the stand-in. */
  signIn(email: string): Promise<Client>;
  visitor(): Client;
  close(): Promise<void>;
}

function clientFor(url: string, cookie: string | null, token: string): Client {
  const send = async (method: Method, path: string, body?: unknown) => {
    const call = request(url)[method](path);
    if (cookie !== null) call.set("cookie", cookie);
    if (method !== "get") call.set("x-csrf-token", token);
    return body === undefined ? call : call.send(body as object);
  };
  return {
    send,
    get: (path) => send("get", path),
    post: (path, body = {}) => send("post", path, body),
    put: (path, body = {}) => send("put", path, body),
    patch: (path, body = {}) => send("patch", path, body),
    delete: (path) => send("delete", path),
  };
}

function cookieOf(response: globalThis.Response): string | null {
  const header = response.headers.get("set-cookie");
  return header === null ? null : (header.split(";")[0] ?? null);
}

async function follow(
  address: string,
  cookie: string | null,
): Promise<{ response: globalThis.Response; cookie: string | null }> {
  const response = await fetch(address, { redirect: "manual", headers: cookie === null ? {} : { cookie } });
  return { response, cookie: cookieOf(response) ?? cookie };
}

/** Walks the redirects of a sign-in by hand: product, stand-in, product. */
export async function signInCookie(url: string, email: string): Promise<string> {
  const start = await follow(`${url}/auth/google?as=${encodeURIComponent(email)}`, null);
  const chosen = await follow(start.response.headers.get("location") ?? "", null);
  const back = await follow(chosen.response.headers.get("location") ?? "", start.cookie);
  if (back.cookie === null) throw new Error(`sign-in of ${email} gave no session`);
  return back.cookie;
}

/** The whole application on a database of its own, listening on loopback. */
export async function startTestApp(name: string, changes: Partial<Config> = {}): Promise<TestApp> {
  const sequelize = await preparedDatabase(name);
  const signInFake = await startSignInFake();
  const mailFake = await startMailFake();
  const server: Server = createServer();
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
  const config = testConfig(name, {
    publicUrl: url,
    google: { clientId: "test", clientSecret: "test-secret", fakeUrl: signInFake.url },
    mail: {
      smtpUrl: mailFake.smtpUrl,
      from: "Glassbyre <no-reply@glassbyre.example>",
      fakeUrl: mailFake.url,
    },
    ...changes,
  });
  const app: App = createApp(config, sequelize, createLog(config));
  server.on("request", app.express);
  return {
    url,
    config,
    sequelize,
    mails: mailFake.mails,
    visitor: () => clientFor(url, null, ""),
    async signIn(email) {
      const cookie = await signInCookie(url, email);
      const me = await request(url).get("/api/me").set("cookie", cookie);
      return clientFor(url, cookie, me.body.csrfToken ?? "");
    },
    async close() {
      await new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      });
      app.close();
      await Promise.all([signInFake.close(), mailFake.close()]);
      await sequelize.close();
    },
  };
}
