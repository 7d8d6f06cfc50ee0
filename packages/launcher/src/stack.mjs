import { rmSync } from 'node:fs';
import { inLocal } from './paths.mjs';
import { freePort } from './ports.mjs';
import { apiMemory, startServer, untilItAnswers, untilItSaysReady } from './servers.mjs';
import { apiEnvironment, standIns } from './settings.mjs';
import { step } from './steps.mjs';

const stripeState = () => inLocal('stripe-stand-in.json');

/** Forgets the sessions and payments of the Stripe stand-in, which name orders that are gone. */
export const forgetPayments = () => rmSync(stripeState(), { force: true });

async function startStripe(secrets, apiPort) {
  const port = await freePort(4313);
  const server = startServer('stripe-stand-in', 'fakes/stripe/dist/main.js', {
    ...process.env,
    PORT: String(port),
    API_KEY: secrets.stripeKey,
    WEBHOOK_URL: `http://127.0.0.1:${apiPort}/api/webhooks/stripe`,
    WEBHOOK_SECRET: secrets.webhookSecret,
    STATE_FILE: stripeState(),
  });
  await untilItSaysReady(server);
  return port;
}

async function startMail() {
  const [http, smtp] = [await freePort(4311), await freePort(4312)];
  const env = { ...process.env, HTTP_PORT: String(http), SMTP_PORT: String(smtp) };
  const server = startServer('mail-stand-in', 'fakes/mail/dist/main.js', env);
  await untilItSaysReady(server);
  return { http, smtp };
}

/**
 * Starts the stand-ins that the reader's settings leave to us.
 * @returns what the API must be told of them, and the inbox's address
 */
export async function startStandIns(secrets, apiPort) {
  const ours = standIns(process.env);
  const made = {};
  let inbox;
  if (ours.stripe) {
    await step('Stripe stand-in', async () => {
      const port = await startStripe(secrets, apiPort);
      made.STRIPE_API_BASE = `http://127.0.0.1:${port}`;
      made.STRIPE_SECRET_KEY = secrets.stripeKey;
      made.STRIPE_WEBHOOK_SECRET = secrets.webhookSecret;
      return `port ${port}`;
    });
  }
  if (ours.mail) {
    await step('Mail stand-in', async () => {
      const { http, smtp } = await startMail();
      made.SMTP_URL = `smtp://127.0.0.1:${smtp}`;
      inbox = `http://localhost:${http}`;
      return `port ${smtp}, inbox on ${http}`;
    });
  }
  return { made, inbox };
}

/**
 * Starts the API and waits until it is ready.
 * @param {object} made values of what this run started
 */
export const startApi = (made) =>
  step('Linkfell', async () => {
    const env = { ...process.env, ...apiEnvironment(process.env, made) };
    const server = startServer('api', 'apps/api/dist/main.js', env, { node: apiMemory });
    await untilItAnswers(server, `http://127.0.0.1:${env.PORT}/health/ready`);
    return `ready on port ${env.PORT}`;
  });
