import { Module } from '@nestjs/common';
import { GarmentsModule } from '../garments/garments.module';
import { FindingsService } from './findings/findings.service';
import { MeasuringController } from './measuring.controller';
import { ProtocolBook } from './protocols/protocol-book';
import { ReadingsService } from './readings/readings.service';
import { SheetEdits } from './sheets/sheet-edits';
import { SheetView } from './sheets/sheet-view';
import { SheetsService } from './sheets/sheets.service';

@Module({
  imports: [GarmentsModule],
  controllers: [MeasuringController],
  providers: [ProtocolBook, SheetEdits, SheetView, SheetsService, ReadingsService, FindingsService],
  exports: [ProtocolBook, SheetsService, ReadingsService, FindingsService],
})
export class MeasuringModule {}
