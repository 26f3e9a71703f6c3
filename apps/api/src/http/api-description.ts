import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';

/** The API's OpenAPI description, as its routes and classes say it. */
export function describeApi(app: INestApplication): OpenAPIObject {
  const head = new DocumentBuilder()
    .setTitle('Lidwatch')
    .setDescription(
      'Instants are ISO 8601 with an offset. Units are in the field names. Errors are problem details (RFC 9457) with a stable code.',
    )
    .setVersion('0.1.0')
    .addCookieAuth('lidwatch')
    .build();
  return SwaggerModule.createDocument(app, head, {
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}.${method}`,
  });
}

/** Serves the description at /api/openapi.json and a page to browse it at /api/docs, with files of its own. */
export function serveApiDescription(app: INestApplication): void {
  SwaggerModule.setup('api/docs', app, () => describeApi(app), {
    jsonDocumentUrl: 'api/openapi.json',
    raw: ['json'],
    customSiteTitle: 'Lidwatch API',
  });
}
