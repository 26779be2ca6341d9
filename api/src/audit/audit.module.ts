import { Global, Module } from '@nestjs/common';
import { AuditListService } from './audit-list.service';
import { AuditController } from './audit.controller';
import { AuditService } from './audit.service';

@Global()
@Module({
  controllers: [AuditController],
  providers: [AuditService, AuditListService],
  exports: [AuditService],
})
export class AuditModule {}
