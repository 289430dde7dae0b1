import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiOperation, ApiTags } from '@nestjs/swagger';
import { Public } from '../auth/public.decorator';
import { ApiProblems } from '../common/problem.dto';
import { DemoAccountsService } from './demo-accounts.service';
import { DemoDto } from './dto/demo.dto';

/** Lets the sign-in screen offer the people of a demo yard. */
@ApiTags('demo')
@Controller('demo')
export class DemoController {
  constructor(private readonly accounts: DemoAccountsService) {}

  @Get()
  @Public()
  @ApiOperation({ summary: 'Who can be tried in a yard of invented data; nobody outside one' })
  @ApiOkResponse({ type: DemoDto })
  @ApiProblems('tooManyRequests', 'internal')
  read(): Promise<DemoDto> {
    return this.accounts.read();
  }
}
