import { join } from 'node:path';
import { MikroORM } from '@mikro-orm/better-sqlite';
import { MikroOrmModule } from '@mikro-orm/nestjs';
import { Module, type DynamicModule, type OnModuleInit } from '@nestjs/common';
import { Clock } from '../common/clock';
import type { Settings } from '../common/settings';
import { assertConnection } from './assert-connection';
import { migrate } from './migrate';
import { ormConfig } from './orm.config';

const DATABASE_FILE = 'lampwright.sqlite';

/** Opens the database and brings it up to date before anything else asks it. */
@Module({})
export class DatabaseModule implements OnModuleInit {
  constructor(
    private readonly orm: MikroORM,
    private readonly clock: Clock,
  ) {}

  static forRoot(settings: Settings): DynamicModule {
    return {
      module: DatabaseModule,
      imports: [MikroOrmModule.forRoot(ormConfig(join(settings.dataDir, DATABASE_FILE)))],
    };
  }

  async onModuleInit(): Promise<void> {
    await assertConnection(this.orm.em);
    await migrate(this.orm, this.orm.config.get('dbName') as string, this.clock.now());
  }
}
