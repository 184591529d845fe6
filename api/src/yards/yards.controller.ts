import { Body, Controller, Get, Param, Put } from '@nestjs/common';
import { YardInput, type YardView } from '@brimgate/rules';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IfMatch } from '../common/if-match.decorator';
import { valid } from '../common/valid.pipe';
import { YardsService } from './yards.service';

@Controller('yards')
export class YardsController {
  constructor(private readonly yards: YardsService) {}

  @Get()
  @Allow('read-yards')
  list(@CurrentUser() user: CurrentUser) {
    return this.yards.list(user);
  }

  @Get(':id')
  @Allow('read-yards')
  show(@Param('id') uuid: string, @CurrentUser() user: CurrentUser): Promise<YardView> {
    return this.yards.show(uuid, user);
  }

  @Put(':id')
  @Allow('edit-yards')
  update(
    @Param('id') uuid: string,
    @Body(valid(YardInput)) input: YardInput,
    @IfMatch() version: number,
    @CurrentUser() user: CurrentUser,
  ): Promise<YardView> {
    return this.yards.update({ uuid, input, version, user });
  }
}
