// The two database users: the owner changes the schema and, migrating, gives the application its rights table by table.

const HOST = '127.0.0.1';
function quoted(text) {
  return `'${text.replaceAll('\\', '\\\\').replaceAll("'", "''")}'`;
}

function identifier(name) {
  return `\`${name.replaceAll('`', '``')}\``;
}

/** In GRANT … ON database.* the name is a pattern, in which _ and % stand for other characters. */
function databasePattern(name) {
  return identifier(name.replaceAll('\\', '\\\\').replaceAll('_', '\\_').replaceAll('%', '\\%'));
}

function account(user) {
  return `${quoted(user)}@${quoted(HOST)}`;
}

/** Never without a password, not even for a moment; an account that exists gets the password of today. */
function accountSql({ user, password }) {
  return [
    `CREATE USER IF NOT EXISTS ${account(user)} IDENTIFIED BY ${quoted(password)};`,
    `ALTER USER ${account(user)} IDENTIFIED BY ${quoted(password)};`,
  ];
}

/** The databases and both accounts. `ownedPattern` may give the owner more databases, such as 'brimgate\\_test\\_%'. */
export function accountsSql({ databases, owner, application, ownedPattern }) {
  const owned = [...databases.map(databasePattern), ...(ownedPattern ? [identifier(ownedPattern)] : [])];
  return [
    ...databases.map(
      (name) =>
        `CREATE DATABASE IF NOT EXISTS ${identifier(name)} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci;`,
    ),
    ...accountSql(owner),
    ...accountSql(application),
    ...owned.map((pattern) => `GRANT ALL PRIVILEGES ON ${pattern}.* TO ${account(owner.user)} WITH GRANT OPTION;`),
  ].join('\n');
}
