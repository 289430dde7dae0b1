import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/public.decorator';
import { ApiProblems } from '../common/problem.dto';
import { DemoAccountsService } from './demo-accounts.service';
import { DEMO_PASSWORD } from './demo-password';
import { DemoDto } from './dto/demo.dto';

@ApiTags('demo')
@Controller('demo')
export class DemoController {
  constructor(private readonly accounts: DemoAccountsService) {}

  @Get()
  @Public()
  @ApiOperation({ summary: 'Who can be tried in a yard of invented data' })
  @ApiOkResponse({ type: DemoDto })
  @ApiProblems('internal')
  async read(): Promise<DemoDto> {
    const people = await this.accounts.list();
    return {
      people: people.map(({ name, email, role }) => ({ name, email, role })),
      password: people.length > 0 ? DEMO_PASSWORD : '',
    };
  }
}
