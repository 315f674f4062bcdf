import connectSessionSequelize from "connect-session-sequelize";
import type { RequestHandler } from "express";
import session from "express-session";
import { DataTypes, type Sequelize } from "sequelize";
import type { Config } from "../config.ts";
import { notSignedIn } from "../errors.ts";

const DAY_MS = 86_400_000;

/** Login sessions kept in the database, so that a restart of the web server signs nobody out. */
export function createSessions(
  sequelize: Sequelize,
  config: Config,
): { handler: RequestHandler; stop(): void } {
  sequelize.define(
    "loginSession",
    {
      sid: { type: DataTypes.STRING(64), primaryKey: true },
      expires: DataTypes.DATE,
      data: DataTypes.TEXT("medium"),
    },
    { tableName: "login_sessions" },
  );
  const Store = connectSessionSequelize(session.Store);
  const store = new Store({ db: sequelize, table: "loginSession", expiration: 14 * DAY_MS });
  const handler = session({
    name: "glassbyre.sid",
    secret: config.sessionSecret,
    store,
    resave: false,
    saveUninitialized: false,
    rolling: false,
    cookie: { httpOnly: true, sameSite: "lax", secure: config.production, maxAge: 14 * DAY_MS },
  });
  return { handler, stop: () => store.stopExpiringSessions() };
}

/** Refuses requests without a signed-in session before anything else about them is looked at. */
export const requireSession: RequestHandler = (request, _response, next) => {
  next(request.session.personId === undefined ? notSignedIn() : undefined);
};
