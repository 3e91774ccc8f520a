/** What each account may do, and nothing else: no FILE, no SUPER, nothing outside its databases. */
const APP = 'SELECT, INSERT, UPDATE, DELETE';
const MIGRATE = `${APP}, CREATE, ALTER, DROP, INDEX, REFERENCES, CREATE VIEW, SHOW VIEW, LOCK TABLES`;
const HOST = '127.0.0.1';

/** @param {string} name @param {string} password @param {string} rights @param {string} on */
const account = (name, password, rights, on) => [
  `CREATE USER IF NOT EXISTS '${name}'@'${HOST}';`,
  `ALTER USER '${name}'@'${HOST}' IDENTIFIED BY '${password}';`,
  `REVOKE ALL PRIVILEGES, GRANT OPTION FROM '${name}'@'${HOST}';`,
  `GRANT ${rights} ON ${on} TO '${name}'@'${HOST}';`,
];

/**
 * What the server runs before it takes connections, at every start: one statement a line.
 * @param {string} database @param {import('./data-folder.mjs').Secrets} secrets @param {boolean} forTests
 */
export function accountsSql(database, secrets, forTests) {
  return [
    `CREATE DATABASE IF NOT EXISTS \`${database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;`,
    'SET sql_log_bin = 0;',
    `DELETE FROM mysql.global_priv WHERE (User = 'root' AND Host <> 'localhost') OR User = '';`,
    `DELETE FROM mysql.proxies_priv WHERE Host <> 'localhost';`,
    'FLUSH PRIVILEGES;',
    `ALTER USER 'root'@'localhost' IDENTIFIED BY '${secrets.root}';`,
    ...account('fumelore_app', secrets.app, APP, `\`${database}\`.*`),
    ...account('fumelore_migrate', secrets.migrate, MIGRATE, `\`${database}\`.*`),
    ...(forTests ? account('fumelore_test', secrets.test, 'ALL PRIVILEGES', '`fumelore\\_test\\_%`.*') : []),
    '',
  ].join('\n');
}
