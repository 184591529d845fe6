import type { WorkView } from '@brimgate/rules';
import { Controller, Get } from '@nestjs/common';
import { SignedIn } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { WorkService } from './work.service';

@Controller('work')
export class WorkController {
  constructor(private readonly work: WorkService) {}

  @Get()
  @SignedIn()
  view(@CurrentUser() user: CurrentUser): Promise<WorkView> {
    return this.work.view(user);
  }
}
