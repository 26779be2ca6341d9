import {
  FindingAnswer,
  NewReadings,
  NewSheet,
  ReadingResults,
  Sheet,
  SheetFacts,
  SheetFindings,
} from '@ellwand/shared/records/sheet';
import { NewTableNotes, TableNoteResults } from '@ellwand/shared/records/table-note';
import { createZodDto } from 'nestjs-zod';

export class NewSheetDto extends createZodDto(NewSheet) {}
export class SheetFactsDto extends createZodDto(SheetFacts) {}
export class SheetDto extends createZodDto(Sheet) {}
export class NewReadingsDto extends createZodDto(NewReadings) {}
export class ReadingResultsDto extends createZodDto(ReadingResults) {}
export class SheetFindingsDto extends createZodDto(SheetFindings) {}
export class FindingAnswerDto extends createZodDto(FindingAnswer) {}
export class NewTableNotesDto extends createZodDto(NewTableNotes) {}
export class TableNoteResultsDto extends createZodDto(TableNoteResults) {}
