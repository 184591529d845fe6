import * as mariadb from 'mariadb';

type Rows = unknown[];
type Query = (sql: unknown, values?: unknown) => Promise<unknown>;

/**
 * Since 3.1 the connector marks `rows.meta` as not configurable, and Sequelize 6 deletes it from the result of raw
 * queries. Asking for rows and metadata apart and putting the metadata back as an ordinary property satisfies both.
 */
function withDeletableMeta(query: Query): Query {
  return async (sql, values) => {
    const options = typeof sql === 'string' ? { sql, metaAsArray: true } : { ...(sql as object), metaAsArray: true };
    const result = await query(options, values);
    if (!Array.isArray(result)) return result;
    const [rows, meta] = result as [Rows | object, unknown];
    // A statement that returns no rows answers with a summary: affected rows and the inserted id.
    if (!Array.isArray(rows)) return rows;
    Object.defineProperty(rows, 'meta', { value: meta, configurable: true, writable: true, enumerable: false });
    return rows;
  };
}

/** The connector as Sequelize's `dialectModule`. */
export const mariadbDialect = {
  ...mariadb,
  async createConnection(config: mariadb.ConnectionConfig) {
    const connection = await mariadb.createConnection(config);
    connection.query = withDeletableMeta(connection.query.bind(connection) as Query) as typeof connection.query;
    return connection;
  },
};
