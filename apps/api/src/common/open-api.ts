import type { NestExpressApplication } from '@nestjs/platform-express';
import { DocumentBuilder, SwaggerModule, type OpenAPIObject } from '@nestjs/swagger';
import { cookieNames } from '../auth/cookies';

export const DOCS_PATH = 'api/docs';

/** Describes every route of the application. */
function createOpenApiDocument(app: NestExpressApplication, https: boolean): OpenAPIObject {
  const config = new DocumentBuilder()
    .setTitle('Lampwright')
    .setDescription(
      'Changes must come from the same origin; a program that is no browser sends "X-Lampwright: 1". ' +
        'Sign in first: the tokens travel in cookies.',
    )
    .setVersion('1')
    .addCookieAuth(cookieNames(https).access)
    .build();
  return SwaggerModule.createDocument(app, config);
}

/** The document at /api/openapi.json, and a page to read it at /api/docs. */
export function useOpenApi(app: NestExpressApplication, https: boolean): void {
  SwaggerModule.setup(DOCS_PATH, app, () => createOpenApiDocument(app, https), {
    jsonDocumentUrl: 'api/openapi.json',
    raw: ['json'],
  });
}
