import { CutSheet, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import { createZodDto } from 'nestjs-zod';

export class NewCutSheetDto extends createZodDto(NewCutSheet) {}
export class CutSheetDto extends createZodDto(CutSheet) {}
