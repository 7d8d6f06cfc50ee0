import 'reflect-metadata';

import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';

import { AppModule } from './app.module.js';
import { ConfigError, readConfig } from './config/config.js';
import { configureApp } from './configure-app.js';

async function main(): Promise<void> {
  const config = readConfig(process.env);
  const app = await NestFactory.create<NestExpressApplication>(AppModule.with(config), {
    // Bodies are parsed after the sessions, and the webhook needs its bytes as they came.
    bodyParser: false,
    rawBody: true,
    bufferLogs: true,
  });
  configureApp(app);
  await app.listen(config.PORT, config.HOST);
}

main().catch((error: unknown) => {
  // The logger may not exist yet; a configuration error is for the person at the terminal.
  console.error(error instanceof ConfigError ? error.message : error);
  process.exitCode = 1;
});
