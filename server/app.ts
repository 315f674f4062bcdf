import compression from "compression";
import express, { type Express } from "express";
import type { Logger } from "pino";
import type { Sequelize } from "sequelize";
import type { Config } from "./config.ts";
import { ENGINE_VERSION } from "./engine/version.ts";
import { AppError } from "./errors.ts";
import { createMail } from "./features/mail/mailer.ts";
import { csrfProtection } from "./http/csrf.ts";
import { errorHandler } from "./http/error-handler.ts";
import { handle } from "./http/handle.ts";
import { describeApi } from "./http/openapi.ts";
import { pages } from "./http/pages.ts";
import { requestLog } from "./http/request-log.ts";
import { requestLimit, securityHeaders } from "./http/security.ts";
import { createSessions, requireSession } from "./http/sessions.ts";
import { signInRoutes } from "./http/sign-in.ts";
import { bindModels } from "./models/associations.ts";
import { routes } from "./routes.ts";

/** The largest survey is a few kilobytes; nothing else is sent in a body. */
const BODY_LIMIT = "1mb";

export interface App {
  express: Express;
  /** Stops what the application keeps going besides requests. */
  close(): void;
}

/** Builds the application on an open database connection. It never listens, so tests can call it directly. */
export function createApp(config: Config, sequelize: Sequelize, log: Logger): App {
  bindModels(sequelize);
  const app = express();
  const sessions = createSessions(sequelize, config);
  const mail = createMail(config, log);
  app.disable("x-powered-by");
  app.set("trust proxy", config.trustProxy);
  app.use(requestLog(log), securityHeaders(config), compression());

  app.get("/api/health", async (_request, response) => {
    const database = await sequelize.authenticate().then(
      () => "ok",
      () => "unreachable",
    );
    response
      .status(database === "ok" ? 200 : 503)
      .json({ status: database === "ok" ? "ok" : "degraded", database, version: ENGINE_VERSION });
  });
  app.get("/api/openapi.json", (_request, response) => {
    response.json(describeApi(routes));
  });

  app.use(["/api", "/auth"], sessions.handler, requestLimit(config));
  app.use(signInRoutes(config, log));
  app.use("/api", express.json({ limit: BODY_LIMIT }));
  for (const route of routes) {
    const guards = route.method === "get" ? [requireSession] : [requireSession, csrfProtection];
    app[route.method](route.path, ...guards, handle(route, { sequelize, config, mailer: mail }));
  }
  app.use("/api", (_request, _response, next) =>
    next(new AppError("not_found", 404, "That address does not exist.")),
  );
  app.use(pages(config.clientFolder));
  app.use(errorHandler(log));
  return {
    express: app,
    close() {
      sessions.stop();
      mail.close();
    },
  };
}
