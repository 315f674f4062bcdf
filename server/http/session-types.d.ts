import "express-session";

declare module "express-session" {
  interface SessionData {
    personId?: string;
    /** Where to go after sign-in. */
    returnTo?: string;
  }
}

declare module "connect-session-sequelize" {
  import type session from "express-session";
  import type { Sequelize } from "sequelize";
  export default function connectSessionSequelize(store: typeof session.Store): new (options: {
    db: Sequelize;
    table: string;
    checkExpirationInterval?: number;
    expiration?: number;
  }) => session.Store & {
    stopExpiringSessions(): void;
  };
}
