import { Global, Module, type DynamicModule } from '@nestjs/common';
import { Clock } from './clock';
import { SETTINGS, type Settings } from './settings';

/** The settings and the clock, for every module. */
@Global()
@Module({})
export class CommonModule {
  static forRoot(settings: Settings): DynamicModule {
    return {
      module: CommonModule,
      providers: [{ provide: SETTINGS, useValue: settings }, Clock],
      exports: [SETTINGS, Clock],
    };
  }
}
