import { startFakeMail } from './index.js';

const { SMTP_PORT, HTTP_PORT } = process.env;

const fake = await startFakeMail({
  smtpPort: SMTP_PORT ? Number(SMTP_PORT) : 0,
  httpPort: HTTP_PORT ? Number(HTTP_PORT) : 0,
});

// The one line that whoever started this waits for.
console.log(JSON.stringify({ ready: true, smtpPort: fake.smtpPort, url: fake.url }));

for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.once(signal, () => {
    void fake.close().then(() => process.exit(0));
  });
}
