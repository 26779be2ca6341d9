import { Module } from '@nestjs/common';
import { ProtocolBookModule } from '../measuring/protocols/protocol-book.module';
import { GarmentEdits } from './garment-edits';
import { GarmentListService } from './garment-list.service';
import { GarmentView } from './garment-view';
import { GarmentsController } from './garments.controller';
import { GarmentsService } from './garments.service';
import { WornTogetherService } from './worn-together.service';

@Module({
  imports: [ProtocolBookModule],
  controllers: [GarmentsController],
  providers: [GarmentEdits, GarmentView, GarmentsService, GarmentListService, WornTogetherService],
  exports: [GarmentEdits, GarmentView, GarmentsService, WornTogetherService],
})
export class GarmentsModule {}
