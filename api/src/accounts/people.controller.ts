import { Controller, Get, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { PageQuery } from '../common/page-query';
import { valid } from '../common/valid.pipe';
import { PeopleService } from './people.service';

@Controller('people')
export class PeopleController {
  constructor(private readonly people: PeopleService) {}

  @Get()
  @Allow('read-people')
  list(@Query(valid(PageQuery)) query: PageQuery, @CurrentUser() user: CurrentUser) {
    return this.people.list(query, user);
  }
}
