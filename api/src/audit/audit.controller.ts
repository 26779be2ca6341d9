import { Controller, Get, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { Requires } from '../common/requires.decorator';
import { AuditListService } from './audit-list.service';
import { AuditPageDto, AuditQueryDto } from './dto/audit.dto';

@ApiTags('Audit')
@Controller('workroom/audit')
export class AuditController {
  constructor(private readonly trail: AuditListService) {}

  @Get()
  @Requires('audit:read')
  @ZodResponse({ status: 200, type: AuditPageDto })
  list(@Query() query: AuditQueryDto) {
    return this.trail.list(query);
  }
}
