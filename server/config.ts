import { z } from 'zod';
import { parseNetwork, type Network } from './http/networks';
import type { MailSettings } from './services/mail/mailer';

const pepper = /^[1-9]\d*:[A-Za-z0-9_-]{43,}$/;

const peppers = z
  .string()
  .refine((value) => value.split(',').every((entry) => pepper.test(entry)), {
    message:
      'write version:secret pairs, comma-separated, each secret 32 bytes or more in base64url',
  })
  .transform(
    (value) =>
      new Map(
        value.split(',').map((entry) => {
          const [version = '', secret = ''] = entry.split(':');
          return [Number(version), Buffer.from(secret, 'base64url')] as const;
        }),
      ),
  );

const secret = z
  .string()
  .regex(/^[A-Za-z0-9_-]{43,}$/, 'must be 32 bytes or more in base64url')
  .transform((value) => Buffer.from(value, 'base64url'));

/** Comma-separated networks; none of everybody, which would be nobody's proxy. */
const networks = z.string().transform((list, context): Network[] =>
  list.split(',').flatMap((entry) => {
    const network = parseNetwork(entry.trim());
    if (network && network.prefix > 0) return [network];
    context.addIssue({
      code: 'custom',
      message: network
        ? `${entry.trim()} is everybody: name the proxies`
        : `${JSON.stringify(entry.trim())} is no network: write for example 10.0.0.0/8 or 2001:db8::/32`,
    });
    return [];
  }),
);

const environment = z
  .object({
    NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
    HOST: z.string().default('127.0.0.1'),
    PORT: z.coerce.number('must be a whole number').int().min(0).max(65_535).default(8080),
    PUBLIC_URL: z
      .url({ protocol: /^https?$/, error: 'must be an http or https address' })
      .optional(),
    TRUSTED_PROXIES: networks.optional(),
    SMTP_URL: z
      .url({ protocol: /^smtps?$/, hostname: /./, error: 'must be an smtp:// or smtps:// address' })
      .optional(),
    MAIL_FROM: z.email('must be an e-mail address alone').optional(),
    DATABASE_URL: z.url({
      protocol: /^postgres(ql)?$/,
      error: 'must be a postgresql:// address',
    }),
    KEY_PEPPERS: peppers,
    SESSION_SECRET: secret,
    WEB_ROOT: z.string().optional(),
    LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error', 'silent']).default('info'),
    COMPUTE_THREADS: z.coerce.number().int().min(1).max(64).optional(),
  })
  .superRefine((values, context) => {
    const refuse = (name: string, message: string) =>
      context.addIssue({ code: 'custom', path: [name], message });
    if (values.SMTP_URL !== undefined && values.MAIL_FROM === undefined) {
      refuse('MAIL_FROM', 'is required beside SMTP_URL');
    }
    if (values.NODE_ENV === 'production') {
      if (values.PUBLIC_URL === undefined) refuse('PUBLIC_URL', 'is required in production');
    } else if (values.HOST !== '127.0.0.1') {
      refuse('HOST', 'may be other than 127.0.0.1 only in production: demo accounts exist here');
    }
  });

export interface Config {
  readonly environment: 'development' | 'test' | 'production';
  readonly host: string;
  readonly port: number;
  /** Origin of links and problem types, without a trailing slash; this machine's where not given. */
  readonly publicUrl: string | undefined;
  /** Peers whose X-Forwarded-For is read; nobody's where none are named. */
  readonly trustedProxies: readonly Network[];
  /** How mail is sent; undefined where none is. */
  readonly mail: MailSettings | undefined;
  readonly databaseUrl: string;
  /** Peppers of API keys by version; the highest version makes new digests. */
  readonly keyPeppers: ReadonlyMap<number, Buffer>;
  /** Signs the access tokens of sessions. */
  readonly sessionSecret: Buffer;
  readonly webRoot: string | undefined;
  readonly logLevel: 'debug' | 'info' | 'warn' | 'error' | 'silent';
  readonly computeThreads: number | undefined;
}

const mailOf = ({ SMTP_URL, MAIL_FROM }: z.output<typeof environment>) =>
  SMTP_URL === undefined || MAIL_FROM === undefined
    ? undefined
    : { smtpUrl: SMTP_URL, from: MAIL_FROM };

/** The environment is wrong; the message names each variable and its reason. */
export class ConfigError extends Error {}

/** Reads the environment once, at start. Throws a ConfigError that names what is wrong. */
export function readConfig(source: Readonly<Record<string, string | undefined>>): Config {
  const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''));
  const parsed = environment.safeParse(given);
  if (!parsed.success) {
    const lines = parsed.error.issues.map(({ path, message }) => {
      const name = String(path[0]);
      return given[name] === undefined ? `${name} is missing (${message})` : `${name}: ${message}`;
    });
    throw new ConfigError(`The environment is not as it must be:\n  ${lines.join('\n  ')}`);
  }
  const values = parsed.data;
  return {
    environment: values.NODE_ENV,
    host: values.HOST,
    port: values.PORT,
    publicUrl: values.PUBLIC_URL?.replace(/\/+$/, ''),
    trustedProxies: values.TRUSTED_PROXIES ?? [],
    mail: mailOf(values),
    databaseUrl: values.DATABASE_URL,
    keyPeppers: values.KEY_PEPPERS,
    sessionSecret: values.SESSION_SECRET,
    webRoot: values.WEB_ROOT,
    logLevel: values.LOG_LEVEL,
    computeThreads: values.COMPUTE_THREADS,
  };
}
