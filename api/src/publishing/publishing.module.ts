import { Module } from '@nestjs/common';
import { GarmentsModule } from '../garments/garments.module';
import { MeasuringModule } from '../measuring/measuring.module';
import { CatalogueWriter } from './projection/catalogue-writer';
import { PublishingController } from './publishing.controller';
import { PublishingService } from './publishing.service';
import { ReviewService } from './review/review.service';

@Module({
  imports: [GarmentsModule, MeasuringModule],
  controllers: [PublishingController],
  providers: [PublishingService, ReviewService, CatalogueWriter],
  exports: [PublishingService],
})
export class PublishingModule {}
