import 'reflect-metadata';
import { NestFactory } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { AppModule } from './app.module.ts';
import { createAdapter, setUpApp } from './app.setup.ts';
import { NoSigningKey } from './certificates/keys/key-folder.ts';
import { ConfigInvalid, readConfig, type Config } from './config/config.schema.ts';
import { serveSite } from './http/serve-site.ts';

function settings(): Config {
  try {
    return readConfig(process.env);
  } catch (error) {
    if (!(error instanceof ConfigInvalid)) throw error;
    console.error(error.message);
    process.exit(1);
  }
}

const config = settings();
const app = await NestFactory.create<NestFastifyApplication>(
  AppModule.with(config),
  createAdapter(config),
  { logger: ['error', 'warn'], abortOnError: false },
);
await setUpApp(app, config);
if (config.SITE_FOLDER !== '') await serveSite(app, config.SITE_FOLDER);
await app.listen(config.PORT, config.HOST).catch((error: unknown) => {
  if (!(error instanceof NoSigningKey)) throw error;
  console.error(error.message);
  process.exit(1);
});
console.log(`ready ${await app.getUrl()}`);
