import { Module, type DynamicModule } from '@nestjs/common';
import { APP_FILTER, APP_GUARD, APP_INTERCEPTOR, APP_PIPE } from '@nestjs/core';
import { ThrottlerModule } from '@nestjs/throttler';
import { LoggerModule } from 'nestjs-pino';
import { AuthModule } from './auth/auth.module';
import { SessionGuard } from './auth/session.guard';
import { CommonModule } from './common/common.module';
import { CrossSiteGuard } from './common/cross-site.guard';
import { loggerOptions } from './common/logging';
import { ProblemFilter } from './common/problem.filter';
import { RequestLimitGuard } from './common/request-limit.guard';
import type { Settings } from './common/settings';
import { TimeoutInterceptor } from './common/timeout.interceptor';
import { createValidationPipe } from './common/validation.pipe';
import { DatabaseModule } from './database/database.module';
import { DemoModule } from './demo/demo.module';
import { HealthModule } from './health/health.module';
import { PeopleModule } from './people/people.module';
import { PlansModule } from './plans/plans.module';
import { TracesModule } from './traces/traces.module';
import { TrailersModule } from './trailers/trailers.module';

const MINUTE_MS = 60_000;

/** The whole API. Guards run in the order in which they stand here. */
@Module({})
export class AppModule {
  static forRoot(settings: Settings): DynamicModule {
    return {
      module: AppModule,
      imports: [
        CommonModule.forRoot(settings),
        LoggerModule.forRoot(loggerOptions(settings.logLevel)),
        DatabaseModule.forRoot(settings),
        ThrottlerModule.forRoot([{ ttl: MINUTE_MS, limit: settings.requestsPerMinute }]),
        AuthModule,
        PeopleModule,
        TrailersModule,
        PlansModule,
        TracesModule,
        HealthModule,
        DemoModule,
      ],
      providers: [
        { provide: APP_FILTER, useClass: ProblemFilter },
        { provide: APP_PIPE, useFactory: createValidationPipe },
        { provide: APP_INTERCEPTOR, useClass: TimeoutInterceptor },
        { provide: APP_GUARD, useClass: CrossSiteGuard },
        { provide: APP_GUARD, useClass: SessionGuard },
        { provide: APP_GUARD, useClass: RequestLimitGuard },
      ],
    };
  }
}
