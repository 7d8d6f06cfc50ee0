import { existsSync } from 'node:fs';
import { inRoot } from './paths.mjs';

/** Reads `.env` into the environment; what is set already stays. */
export function loadEnvFile() {
  if (existsSync(inRoot('.env'))) process.loadEnvFile(inRoot('.env'));
}

/** An empty value means "not set", as in an .env file. */
const given = (env) => Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));

/**
 * Which of the local stand-ins the reader's own settings leave to us. Somebody with a Stripe key and no address of
 * another server means the real Stripe.
 */
export function standIns(env) {
  const { STRIPE_SECRET_KEY, STRIPE_API_BASE, SMTP_URL, DATABASE_URL } = given(env);
  return {
    stripe: !STRIPE_SECRET_KEY && !STRIPE_API_BASE,
    mail: !SMTP_URL,
    cluster: !DATABASE_URL,
  };
}

/** The port of the web address, from the environment. */
export const portIn = (env) => Number(given(env).PORT ?? 4310);

/**
 * The API's environment: the reader's own values win over what the stand-ins need.
 * @param {object} env the environment we were started with
 * @param {object} made values of what this run started; those undefined are left out
 */
export function apiEnvironment(env, made) {
  const defaults = {
    NODE_ENV: 'production',
    PORT: String(portIn(env)),
    PUBLIC_URL: `http://localhost:${portIn(env)}`,
    WEB_DIST: inRoot('apps/web/dist'),
    MAIL_FROM: 'Linkfell <post@linkfell.example>',
    LOG_LEVEL: 'info',
  };
  const known = Object.fromEntries(Object.entries(made).filter(([, value]) => value !== undefined));
  return { ...defaults, ...known, ...given(env) };
}
