import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module';
import { apiCaching } from './common/api-caching';
import { useBodyParsers } from './common/body-parsers';
import { DOCS_PATH, useOpenApi } from './common/open-api';
import { requestId } from './common/request-id';
import { docsHeaders, securityHeaders } from './common/security-headers';
import type { Settings } from './common/settings';
import { useWebFiles } from './common/web-files';

/** Builds the application as it runs, up to listening. */
export async function createApp(settings: Settings): Promise<NestExpressApplication> {
  const app = await NestFactory.create<NestExpressApplication>(AppModule.forRoot(settings), {
    bodyParser: false,
    // Silent until the logger is there; a failed start is explained by whoever called.
    logger: false,
    abortOnError: false,
  });
  app.useLogger(app.get(Logger));
  app.setGlobalPrefix('api');
  app.set('trust proxy', settings.trustProxy);
  app.disable('x-powered-by');
  app.use(requestId);
  app.use(securityHeaders(settings.https));
  app.use(`/${DOCS_PATH}`, docsHeaders(settings.https));
  app.use('/api', apiCaching);
  app.use(compression());
  app.use(cookieParser());
  useBodyParsers(app);
  useWebFiles(app, settings.webDir);
  useOpenApi(app, settings.https);
  return app;
}
