import { EntityManager } from '@mikro-orm/better-sqlite';
import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiProperty, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/public.decorator';
import { ApiProblems } from '../common/problem.dto';

export class HealthDto {
  @ApiProperty({ enum: ['ok'] })
  status: 'ok';
}

/** Whether the server answers and its database too. */
@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(private readonly em: EntityManager) {}

  @Get()
  @Public()
  @ApiOperation({ summary: 'Whether the server and its database answer' })
  @ApiOkResponse({ type: HealthDto })
  @ApiProblems('internal')
  async read(): Promise<HealthDto> {
    await this.em.getConnection().execute('select 1');
    return { status: 'ok' };
  }
}
