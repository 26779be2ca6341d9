import { Uuid } from '@ellwand/shared/records/common';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';

export class IdParam extends createZodDto(z.object({ id: Uuid })) {}
