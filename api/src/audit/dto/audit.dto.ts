import { pageOf, Paging, Uuid } from '@ellwand/shared/records/common';
import { AuditEntry } from '@ellwand/shared/records/publishing';
import { createZodDto } from 'nestjs-zod';

export class AuditQueryDto extends createZodDto(Paging.extend({ subjectId: Uuid.optional() })) {}
export class AuditPageDto extends createZodDto(pageOf(AuditEntry)) {}
