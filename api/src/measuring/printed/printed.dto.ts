import { kindIds } from '@ellwand/shared/points/kinds';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';
import { Paper } from './paper/paper-size';

export class PaperQuery extends createZodDto(z.strictObject({ paper: Paper.default('a4') })) {}

export class KindParam extends createZodDto(z.object({ kind: z.enum(kindIds) })) {}
