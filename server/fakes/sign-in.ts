import type { IncomingMessage } from "node:http";
import express, { type Request } from "express";
import { OAuth2Issuer, OAuth2Service } from "oauth2-mock-server";
import { type DemoPerson, demoPeople } from "../database/demo/people.ts";
import { chooserPage } from "./chooser-page.ts";

/** Claims the real service would give about a person. */
function claims(person: DemoPerson) {
  const [givenName, ...rest] = person.name.split(" ");
  return {
    sub: `demo-${person.key}`,
    email: person.email,
    email_verified: true,
    name: person.name,
    given_name: givenName,
    family_name: rest.join(" "),
  };
}

function bearer(request: Request): string {
  const header = request.headers.authorization ?? "";
  return header.startsWith("Bearer ") ? header.slice(7) : String(request.query.access_token ?? "");
}

function subjectOf(token: string): string | undefined {
  const payload = token.split(".")[1];
  if (payload === undefined) return undefined;
  return (JSON.parse(Buffer.from(payload, "base64url").toString()) as { sub?: string }).sub;
}

/**
 * Stands in for Google's sign-in on loopback: a chooser of the demo people in front of an OAuth 2 mock.
 * Several people can sign in at once, because each code remembers its own person.
 */
export async function startSignInFake(port = 0): Promise<{ url: string; close(): Promise<void> }> {
  const issuer = new OAuth2Issuer();
  await issuer.keys.generate("RS256");
  const service = new OAuth2Service(issuer);
  const personByCode = new Map<string, DemoPerson>();
  const byEmail = (email: unknown) => demoPeople.find((person) => person.email === email);

  service.on("beforeAuthorizeRedirect", (redirect: { url: URL }, request: IncomingMessage) => {
    const person = byEmail((request as Request).query.login_hint);
    const code = redirect.url.searchParams.get("code");
    if (person && code) personByCode.set(code, person);
  });
  service.on(
    "beforeTokenSigning",
    (token: { payload: Record<string, unknown> }, request: IncomingMessage) => {
      const person = personByCode.get(String((request as Request).body?.code));
      if (person) Object.assign(token.payload, claims(person));
    },
  );
  service.on(
    "beforeResponse",
    (response: { body: unknown; statusCode: number }, request: IncomingMessage) => {
      if (personByCode.delete(String((request as Request).body?.code))) return;
      response.statusCode = 400;
      response.body = { error: "invalid_grant" };
    },
  );
  service.on(
    "beforeUserinfo",
    (response: { body: unknown; statusCode: number }, request: IncomingMessage) => {
      const person = demoPeople.find(
        (entry) => `demo-${entry.key}` === subjectOf(bearer(request as Request)),
      );
      response.statusCode = person ? 200 : 401;
      response.body = person ? claims(person) : { error: "invalid_token" };
    },
  );

  const app = express();
  app.get("/authorize", (request, response, next) => {
    if (byEmail(request.query.login_hint)) return next();
    const query = Object.fromEntries(
      Object.entries(request.query).map(([name, value]) => [name, String(value)]),
    );
    response.type("html").send(chooserPage(demoPeople, query));
  });
  app.use(service.requestHandler);

  return new Promise((resolve, reject) => {
    const server = app.listen(port, "127.0.0.1", (error) => {
      if (error) return reject(error);
      const address = server.address();
      const url = `http://127.0.0.1:${typeof address === "object" && address ? address.port : port}`;
      issuer.url = url;
      resolve({
        url,
        close: () =>
          new Promise<void>((done) => {
            server.close(() => done());
            server.closeAllConnections();
          }),
      });
    });
  });
}
