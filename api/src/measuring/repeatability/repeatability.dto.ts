import { Repeatability, RepeatabilityQuery } from '@ellwand/shared/records/repeatability';
import { createZodDto } from 'nestjs-zod';

export class RepeatabilityDto extends createZodDto(Repeatability) {}
export class RepeatabilityQueryDto extends createZodDto(RepeatabilityQuery) {}
