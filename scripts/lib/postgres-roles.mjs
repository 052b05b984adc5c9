import { randomBytes } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'

/**
 * Three roles: the cluster's administrator; the owner of the tables, who migrates; and the application, which reads
 * and writes rows but cannot drop a trigger or empty a table, so that the history keeps its guards.
 * @typedef {'admin' | 'stillfits_owner' | 'stillfits_app'} Role
 * @typedef {Record<Role, string>} Passwords
 */

/** Other users of this machine can reach the port too, so trusting every local connection would not do. */
export function readPasswords(/** @type {string} */ home) {
  const file = join(home, 'passwords.json')
  if (!existsSync(file)) {
    const make = () => randomBytes(24).toString('hex')
    writeFileSync(file, JSON.stringify({ admin: make(), stillfits_owner: make(), stillfits_app: make() }), {
      mode: 0o600,
    })
  }
  return /** @type {Passwords} */ (JSON.parse(readFileSync(file, 'utf8')))
}

/** Makes the roles, or mends them: a start cut short is completed by the next. */
export function describeRoles(/** @type {Passwords} */ passwords) {
  const role = (/** @type {Exclude<Role, 'admin'>} */ name) => `
    SELECT 'CREATE ROLE ${name}' WHERE NOT EXISTS (SELECT FROM pg_roles WHERE rolname = '${name}') \\gexec
    ALTER ROLE ${name} LOGIN PASSWORD '${passwords[name]}';`
  return role('stillfits_owner') + role('stillfits_app')
}

export function describeDatabase(/** @type {string} */ name) {
  return `
    SELECT 'CREATE DATABASE ${name} OWNER stillfits_owner'
      WHERE NOT EXISTS (SELECT FROM pg_database WHERE datname = '${name}') \\gexec
    \\connect ${name}
    ALTER DEFAULT PRIVILEGES FOR ROLE stillfits_owner IN SCHEMA public
      GRANT SELECT, INSERT, UPDATE, DELETE ON TABLES TO stillfits_app;
    ALTER DEFAULT PRIVILEGES FOR ROLE stillfits_owner IN SCHEMA public
      GRANT USAGE, SELECT ON SEQUENCES TO stillfits_app;`
}
