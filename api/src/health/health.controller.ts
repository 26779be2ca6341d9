import { Controller, Get, Header, Res } from '@nestjs/common';
import { SkipThrottle } from '@nestjs/throttler';
import type { Response } from 'express';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { z } from 'zod';
import { Public } from '../common/public.decorator';
import { ReadinessService } from './readiness.service';

class LiveDto extends createZodDto(z.object({ alive: z.literal(true) })) {}
class ReadyDto extends createZodDto(
  z.object({
    ready: z.boolean(),
    database: z.enum(['answers', 'silent']),
    migrations: z.enum(['current', 'behind', 'unknown']),
    disk: z.enum(['enough', 'low', 'unreachable']),
    ending: z.boolean(),
  }),
) {}

/** For whoever watches over the process; outside of `/api/v1`. */
@Public()
@SkipThrottle()
@Controller('health')
export class HealthController {
  constructor(private readonly readiness: ReadinessService) {}

  /** Answers as long as the process can answer at all; says nothing of the database. */
  @Get('live')
  @Header('Cache-Control', 'no-store')
  @ZodResponse({ status: 200, type: LiveDto })
  live(): { alive: true } {
    return { alive: true };
  }

  /** 200 where requests may be sent here, else 503 with what is amiss. */
  @Get('ready')
  @Header('Cache-Control', 'no-store')
  @ZodResponse({ status: 200, type: ReadyDto })
  async ready(@Res({ passthrough: true }) response: Response) {
    const state = await this.readiness.look();
    if (!state.ready) response.status(503);
    return state;
  }
}
