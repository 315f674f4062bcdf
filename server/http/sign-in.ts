import { type NextFunction, type Request, type Response, Router } from "express";
import passport from "passport";
import { type Profile, Strategy } from "passport-google-oauth20";
import type { Logger } from "pino";
import type { Config } from "../config.ts";
import { demoPeople } from "../database/demo/people.ts";
import { personForProfile } from "../features/session/person-for-profile.ts";
import { csrfProtection } from "./csrf.ts";

interface SignedIn {
  personId: string | null;
}

function strategy(config: Config): Strategy {
  const base = config.google.fakeUrl;
  return new Strategy(
    {
      clientID: config.google.clientId,
      clientSecret: config.google.clientSecret,
      callbackURL: `${config.publicUrl}/auth/google/callback`,
      scope: ["openid", "email", "profile"],
      state: true,
      pkce: true,
      ...(base === null
        ? {}
        : {
            authorizationURL: `${base}/authorize`,
            tokenURL: `${base}/token`,
            userProfileURL: `${base}/userinfo`,
          }),
    },
    (_access: string, _refresh: string, profile: Profile, done) => {
      personForProfile(profile)
        .then((person) => done(null, { personId: person?.id ?? null } satisfies SignedIn))
        .catch(done);
    },
  );
}

/** Only addresses of this product are gone back to. */
function safeReturn(path: unknown): string {
  return typeof path === "string" && /^\/(?![/\\])[\w\-/?=&%.]*$/.test(path) ? path : "/";
}

function keepReturn(request: Request, _response: Response, next: NextFunction): void {
  request.session.returnTo = safeReturn(request.query.to);
  next();
}

/** A fresh session for a signed-in person, so that an identifier known before sign-in is worth nothing. */
function openSession(request: Request, response: Response, next: NextFunction): void {
  const { personId } = request.user as SignedIn;
  const target = safeReturn(request.session.returnTo);
  request.session.regenerate((error) => {
    if (error) return next(error);
    if (personId === null) return response.redirect("/no-access");
    request.session.personId = personId;
    request.session.save((failure) => (failure ? next(failure) : response.redirect(target)));
  });
}

/**
 * Sign-in by Google. Who somebody is comes from Google, what they may do comes from our own tables.
 * `?as=` names a demo person and is honoured only while the stand-in is in use.
 */
export function signInRoutes(config: Config, log: Logger): Router {
  passport.use(strategy(config));
  const router = Router();
  router.get("/auth/google", keepReturn, (request, response, next) => {
    const hint =
      config.google.fakeUrl !== null && typeof request.query.as === "string" ? request.query.as : undefined;
    passport.authenticate("google", { session: false, prompt: "select_account", loginHint: hint })(
      request,
      response,
      next,
    );
  });
  router.get(
    "/auth/google/callback",
    (request, response, next) => {
      passport.authenticate("google", { session: false }, (error: Error | null, user: SignedIn | false) => {
        if (error) log.warn({ reason: error.message }, "sign-in refused");
        if (error || !user) return response.redirect("/sign-in?failed=1");
        request.user = user;
        next();
      })(request, response, next);
    },
    openSession,
  );
  router.post("/auth/sign-out", csrfProtection, (request, response, next) => {
    request.session.destroy((error) => {
      if (error) return next(error);
      response.clearCookie("glassbyre.sid").status(204).end();
    });
  });
  router.get("/api/sign-in-options", (_request, response) => {
    const shown = demoPeople.map(({ name, email, role, farm }) => ({ name, email, role, farm }));
    response.json({ fakePeople: config.google.fakeUrl === null ? null : shown });
  });
  return router;
}
