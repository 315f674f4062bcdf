import { Sequelize } from "sequelize";
import { mariadbDialect } from "./mariadb-dialect.ts";

export interface DatabaseAddress {
  host: string;
  port: number;
  name: string;
  user: string;
  password: string;
}

/** A pool of connections to one database. Times are kept in UTC; identifiers are compared byte by byte. */
export function connect(address: DatabaseAddress): Sequelize {
  return new Sequelize(address.name, address.user, address.password, {
    host: address.host,
    port: address.port,
    dialect: "mariadb",
    dialectModule: mariadbDialect,
    dialectOptions: { connectTimeout: 5000 },
    timezone: "+00:00",
    logging: false,
    pool: { max: 10, min: 0, acquire: 10_000, idle: 10_000 },
    define: { underscored: true, charset: "utf8mb4", collate: "utf8mb4_unicode_ci" },
  });
}
