import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import { FeedstuffInput, type FeedstuffView } from '@brimgate/rules';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { IfMatch } from '../common/if-match.decorator';
import { valid } from '../common/valid.pipe';
import { FeedstuffsService } from './feedstuffs.service';

@Controller('feedstuffs')
export class FeedstuffsController {
  constructor(private readonly feedstuffs: FeedstuffsService) {}

  @Get()
  @Allow('read-feedstuffs')
  list(@CurrentUser() user: CurrentUser) {
    return this.feedstuffs.list(user);
  }

  @Get(':id')
  @Allow('read-feedstuffs')
  show(@Param('id') id: string, @CurrentUser() user: CurrentUser): Promise<FeedstuffView> {
    return this.feedstuffs.show(id, user);
  }

  @Post()
  @Allow('edit-feedstuffs')
  create(@Body(valid(FeedstuffInput)) input: FeedstuffInput, @CurrentUser() user: CurrentUser): Promise<FeedstuffView> {
    return this.feedstuffs.create(input, user);
  }

  @Put(':id')
  @Allow('edit-feedstuffs')
  update(
    @Param('id') uuid: string,
    @Body(valid(FeedstuffInput)) input: FeedstuffInput,
    @IfMatch() version: number,
    @CurrentUser() user: CurrentUser,
  ): Promise<FeedstuffView> {
    return this.feedstuffs.update({ uuid, input, version }, user);
  }
}
