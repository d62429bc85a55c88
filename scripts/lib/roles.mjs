/** Makes a role that may log in, when it is missing, and gives it its password and rights. */
const role = (name, password, rights = '') => `
SELECT 'CREATE ROLE ${name}' WHERE NOT EXISTS (SELECT FROM pg_roles WHERE rolname = '${name}') \\gexec
ALTER ROLE ${name} LOGIN NOSUPERUSER NOCREATEROLE ${rights || 'NOCREATEDB'} PASSWORD '${password}';
`;

const database = (name, owner) => `
SELECT 'CREATE DATABASE ${name} OWNER ${owner}'
 WHERE NOT EXISTS (SELECT FROM pg_database WHERE datname = '${name}') \\gexec
`;

export const ownerRole = 'stepwell_owner';
export const appRole = 'stepwell_app';
const name = 'stepwell';

/**
 * Two roles, one database: the owner makes the schema; the running server's role has no DDL and
 * gets its rights on tables from the migrations.
 */
export async function makeDatabase(cluster, secrets) {
  await cluster.sql(
    role(ownerRole, secrets.databaseOwner) +
      role(appRole, secrets.databaseApp) +
      database(name, ownerRole) +
      `REVOKE ALL ON DATABASE ${name} FROM PUBLIC;
       GRANT CONNECT ON DATABASE ${name} TO ${appRole};`,
  );
  // Before PostgreSQL 15 everybody could create tables in the schema `public`.
  await cluster.sql(
    `REVOKE CREATE ON SCHEMA public FROM PUBLIC; GRANT ALL ON SCHEMA public TO ${ownerRole};`,
    name,
  );
  return {
    databaseUrl: cluster.url(appRole, secrets.databaseApp, name),
    migrationUrl: cluster.url(ownerRole, secrets.databaseOwner, name),
  };
}

/**
 * For tests: a role that may create databases, whose address is answered, and beside it the
 * running server's role with the same password, so that what it may not do can be shown. The
 * first is a member of the second: it must end its connections to drop a database.
 */
export async function makeTestRoles(cluster, password) {
  const tester = 'stepwell_test';
  await cluster.sql(
    role(tester, password, 'CREATEDB') + role(appRole, password) + `GRANT ${appRole} TO ${tester};`,
  );
  return cluster.url(tester, password, 'postgres');
}
