import { z } from 'zod';

const url = (protocols: string[]) =>
  z
    .string({ error: 'is not set' })
    .refine(
      (value) => URL.canParse(value) && protocols.includes(new URL(value).protocol),
      `must be an address that starts with ${protocols.join(' or ')}`,
    );
const text = z.string({ error: 'is not set' }).min(1, 'must not be empty');
const wholeNumber = (min: number, max: number, byDefault: number) =>
  z
    .string()
    .regex(/^\d+$/, 'must be a whole number')
    .transform(Number)
    .refine((value) => value >= min && value <= max, `must be between ${min} and ${max}`)
    .default(byDefault);

/** Every variable the server reads, and nothing else reads the environment. Documented in .env.example. */
export const environment = z.object({
  NODE_ENV: z
    .enum(['production', 'development', 'test'], 'must be production, development or test')
    .default('production'),
  PORT: wholeNumber(0, 65_535, 4310),
  HOST: z.string().default('127.0.0.1'),
  /** Where riders reach us; decides cookie names, HSTS and every link in a mail. */
  PUBLIC_URL: url(['http:', 'https:']).transform((value) => value.replace(/\/+$/, '')),
  DATABASE_URL: url(['postgres:', 'postgresql:']),
  SESSION_SECRET: text.min(32, 'must have at least 32 characters'),
  STRIPE_SECRET_KEY: text,
  STRIPE_WEBHOOK_SECRET: text,
  /** Another place than the payment provider's own, such as the local fake. */
  STRIPE_API_BASE: url(['http:', 'https:']).optional(),
  SMTP_URL: url(['smtp:', 'smtps:']),
  MAIL_FROM: text.default('Linkfell <post@linkfell.example>'),
  /** Folder of the built web app; without it only the API is served. */
  WEB_DIST: text.optional(),
  LOG_LEVEL: z
    .enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent'], 'is not a log level')
    .default('info'),
  /** How long stock and slot are held while the rider pays. The provider refuses less than 30. */
  HOLD_MINUTES: wholeNumber(1, 1_440, 31),
  /** Number of reverse proxies in front whose X-Forwarded-* we believe. */
  TRUST_PROXY: wholeNumber(0, 8, 0),
  /** "off" where another process of the same release works the outbox. */
  WORKER: z.enum(['in-process', 'off'], 'must be in-process or off').default('in-process'),
  /** Multiplies every rate limit; for load tests and browser tests from one address. */
  RATE_LIMIT_SCALE: wholeNumber(1, 1_000_000, 1),
});

export type Config = Readonly<z.infer<typeof environment>> & { readonly https: boolean };

/** Injection token of {@link Config}. */
export const CONFIG = Symbol('config');

export class ConfigError extends Error {}

/**
 * Reads and checks the configuration.
 * @throws ConfigError with one line per variable that is missing or wrong; values are not repeated, they may be secrets
 */
export function readConfig(env: Record<string, string | undefined>): Config {
  // An empty value in an .env file means "not set".
  const given = Object.fromEntries(
    Object.entries(env).filter(([, value]) => value !== undefined && value !== ''),
  );
  const parsed = environment.safeParse(given);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')} ${issue.message}`);
    throw new ConfigError(`The configuration is not usable:\n${lines.join('\n')}`);
  }
  return { ...parsed.data, https: parsed.data.PUBLIC_URL.startsWith('https:') };
}
