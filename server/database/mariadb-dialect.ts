import * as mariadb from "mariadb";

/**
 * Sequelize 6 deletes `meta` from the rows of a raw query; recent connectors define it as fixed, and the delete throws.
 * This wraps the connector: rows are copied, and `meta` is defined again so that it can be deleted.
 * Sequelize asks for the callback-free API of the package, which is what is wrapped here.
 */
type Query = (...parameters: unknown[]) => Promise<unknown>;

function withRemovableMeta(answer: unknown): unknown {
  if (!Array.isArray(answer) || !Object.hasOwn(answer, "meta")) return answer;
  const rows = answer.slice();
  Object.defineProperty(rows, "meta", {
    value: (answer as unknown as { meta: unknown }).meta,
    configurable: true,
    writable: true,
    enumerable: false,
  });
  return rows;
}

async function createConnection(options: mariadb.ConnectionConfig): Promise<mariadb.Connection> {
  const connection = await mariadb.createConnection(options);
  const target = connection as unknown as { query: Query };
  const query = target.query.bind(connection);
  target.query = async (...parameters) => withRemovableMeta(await query(...parameters));
  return connection;
}

export const mariadbDialect = { ...mariadb, createConnection };
