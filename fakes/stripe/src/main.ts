import { startFakeStripe } from './index.js';

const { PORT, API_KEY, WEBHOOK_URL, WEBHOOK_SECRET, STATE_FILE } = process.env;

const fake = await startFakeStripe({
  port: PORT ? Number(PORT) : 0,
  apiKey: API_KEY,
  webhookUrl: WEBHOOK_URL,
  webhookSecret: WEBHOOK_SECRET,
  stateFile: STATE_FILE,
});

// The one line that whoever started this waits for.
console.log(JSON.stringify({ ready: true, url: fake.url }));

for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.once(signal, () => {
    void fake.close().then(() => process.exit(0));
  });
}
