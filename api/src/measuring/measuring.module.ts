import { Module } from '@nestjs/common';
import { GarmentsModule } from '../garments/garments.module';
import { CutSheetsController } from './cut-sheets/cut-sheets.controller';
import { CutSheetsService } from './cut-sheets/cut-sheets.service';
import { DamageService } from './damage/damage.service';
import { FindingsService } from './findings/findings.service';
import { MeasuringController } from './measuring.controller';
import { NotedController } from './noted/noted.controller';
import { NotedService } from './noted/noted.service';
import { PartSheetsController } from './part-sheets/part-sheets.controller';
import { PartSheetsService } from './part-sheets/part-sheets.service';
import { PartSheetsView } from './part-sheets/part-sheets-view';
import { PrintedSheetsController } from './printed/printed-sheets.controller';
import { PrintedSheetsService } from './printed/printed-sheets.service';
import { ProtocolBookModule } from './protocols/protocol-book.module';
import { ProtocolsController } from './protocols/protocols.controller';
import { ProtocolsService } from './protocols/protocols.service';
import { SheetProtocolService } from './protocols/sheet-protocol.service';
import { ReadingsService } from './readings/readings.service';
import { RepeatabilityController } from './repeatability/repeatability.controller';
import { RepeatabilityService } from './repeatability/repeatability.service';
import { SheetEdits } from './sheets/sheet-edits';
import { SheetView } from './sheets/sheet-view';
import { SheetsService } from './sheets/sheets.service';
import { TableNotesService } from './table-notes/table-notes.service';

@Module({
  imports: [GarmentsModule, ProtocolBookModule],
  controllers: [
    MeasuringController,
    ProtocolsController,
    CutSheetsController,
    RepeatabilityController,
    PartSheetsController,
    NotedController,
    PrintedSheetsController,
  ],
  providers: [
    ProtocolsService,
    SheetProtocolService,
    SheetEdits,
    SheetView,
    SheetsService,
    ReadingsService,
    FindingsService,
    TableNotesService,
    CutSheetsService,
    RepeatabilityService,
    PartSheetsService,
    PartSheetsView,
    DamageService,
    NotedService,
    PrintedSheetsService,
  ],
  exports: [
    ProtocolBookModule,
    ProtocolsService,
    SheetsService,
    ReadingsService,
    FindingsService,
    CutSheetsService,
    PartSheetsService,
  ],
})
export class MeasuringModule {}
