import { Controller, Get, HttpStatus, Res } from '@nestjs/common';
import type { Response } from 'express';
import { Open } from '../common/allow.decorator';
import { ReadinessService } from './readiness.service';

@Controller()
export class HealthController {
  constructor(private readonly readiness: ReadinessService) {}

  /** The process runs. It never asks the database: a restart would not mend that. */
  @Get('livez')
  @Open()
  live() {
    return { status: 'alive' };
  }

  /** Requests may come. */
  @Get('readyz')
  @Open()
  async ready(@Res({ passthrough: true }) response: Response) {
    const obstacles = await this.readiness.obstacles();
    if (obstacles.length > 0) response.status(HttpStatus.SERVICE_UNAVAILABLE);
    return { status: obstacles.length === 0 ? 'ready' : 'not ready', obstacles };
  }
}
