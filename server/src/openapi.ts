import { NestFactory } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { DocumentBuilder, SwaggerModule } from '@nestjs/swagger';
import { AppModule } from './app.module.ts';
import { createAdapter } from './app.setup.ts';
import { readConfig } from './config/config.schema.ts';

/** Settings that satisfy the schema; nothing connects while the document is written. */
const config = readConfig({
  NODE_ENV: 'test',
  PUBLIC_URL: 'http://127.0.0.1:4780',
  DATABASE_URL: 'postgres://nobody@127.0.0.1:1/nothing',
  SESSION_SECRET: '00'.repeat(32),
  DRAW_SECRET: '00'.repeat(32),
  SECOND_FACTOR_KEY: '00'.repeat(32),
  SMTP_URL: 'smtp://127.0.0.1:1',
  MAIL_FROM: 'nobody@localhost',
  KEYS_FOLDER: '/nonexistent',
});

/** The API document, from the routes alone: no provider is made. */
export async function describeApi(): Promise<string> {
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with(config),
    createAdapter(config),
    { logger: false, preview: true, abortOnError: false },
  );
  const document = SwaggerModule.createDocument(
    app,
    new DocumentBuilder().setTitle('Ferrule').setVersion('1').build(),
    {
      operationIdFactory: (controller, method) =>
        `${controller.replace(/Controller$/, '')}_${method}`,
    },
  );
  return `${JSON.stringify(document, null, 2)}\n`;
}
