import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import { configureApp } from './app.setup';
import { describeApi } from './http/api-description';

/** The API's OpenAPI description as JSON, from the whole service put together but neither started nor listening. */
export async function describeService(): Promise<string> {
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    bodyParser: false,
    logger: ['error'],
  });
  configureApp(app);
  const description = describeApi(app);
  await app.close();
  return `${JSON.stringify(description, null, 2)}\n`;
}
