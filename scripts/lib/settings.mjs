import { Failure } from './failure.mjs';

const modes = ['development', 'test', 'production'];
const isPort = (value) => /^\d{1,5}$/.test(value) && Number(value) >= 1 && Number(value) <= 65_535;
const isAddress = (value, protocols) =>
  URL.canParse(value) && protocols.test(new URL(value).protocol);

const postgres = [
  (value) => isAddress(value, /^postgres(ql)?:$/),
  'must be a postgresql:// address',
];

const checks = {
  NODE_ENV: [(value) => modes.includes(value), `must be one of ${modes.join(', ')}`],
  PORT: [isPort, 'must be a whole number from 1 to 65535'],
  PUBLIC_URL: [(value) => isAddress(value, /^https?:$/), 'must be an http or https address'],
  DATABASE_URL: postgres,
  MIGRATION_DATABASE_URL: postgres,
  SMTP_URL: [(value) => isAddress(value, /^smtps?:$/), 'must be an smtp:// or smtps:// address'],
};

/**
 * What the scripts need of the environment, checked before any long step; the server checks the
 * whole once more for itself. Empty counts as not given. Throws a Failure that names each
 * variable and its reason.
 */
export function readSettings(env) {
  const given = (name) => env[name] || undefined;
  const faults = Object.entries(checks)
    .filter(([name, [check]]) => given(name) !== undefined && !check(given(name)))
    .map(([name, [, reason]]) => `  ${name} ${reason}.`);
  if (given('MIGRATION_DATABASE_URL') && !given('DATABASE_URL')) {
    faults.push('  DATABASE_URL is missing beside MIGRATION_DATABASE_URL.');
  }
  if (faults.length > 0) {
    throw new Failure(`The environment is not as it must be:\n${faults.join('\n')}`);
  }
  const port = Number(given('PORT') ?? 8080);
  return {
    mode: given('NODE_ENV') ?? 'development',
    host: given('HOST') ?? '127.0.0.1',
    port,
    publicUrl: given('PUBLIC_URL') ?? `http://localhost:${port}`,
    databaseUrl: given('DATABASE_URL'),
    migrationUrl: given('MIGRATION_DATABASE_URL'),
    smtpUrl: given('SMTP_URL'),
  };
}
