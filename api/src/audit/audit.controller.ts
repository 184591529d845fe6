import { Controller, Get, Query } from '@nestjs/common';
import { Allow } from '../common/allow.decorator';
import { CurrentUser } from '../common/current-user';
import { valid } from '../common/valid.pipe';
import { AuditEventsService, AuditQuery } from './audit-events.service';

@Controller('audit-events')
export class AuditController {
  constructor(private readonly events: AuditEventsService) {}

  /** What was done in the firm, newest first. */
  @Get()
  @Allow('read-audit')
  list(@Query(valid(AuditQuery)) query: AuditQuery, @CurrentUser() user: CurrentUser) {
    return this.events.list(query, user);
  }
}
