import { Module } from '@nestjs/common';
import { ProtocolBookModule } from '../measuring/protocols/protocol-book.module';
import { GarmentEdits } from './garment-edits';
import { GarmentListService } from './garment-list.service';
import { GarmentView } from './garment-view';
import { GarmentsController } from './garments.controller';
import { GarmentsService } from './garments.service';

@Module({
  imports: [ProtocolBookModule],
  controllers: [GarmentsController],
  providers: [GarmentEdits, GarmentView, GarmentsService, GarmentListService],
  exports: [GarmentEdits, GarmentView, GarmentsService],
})
export class GarmentsModule {}
