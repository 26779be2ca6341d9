import { Module } from '@nestjs/common';
import { AppModule } from '../app.module';
import { AuthModule } from '../auth/auth.module';
import { GarmentsModule } from '../garments/garments.module';
import { MeasuringModule } from '../measuring/measuring.module';
import { MediaModule } from '../media/media.module';
import { PublishingModule } from '../publishing/publishing.module';
import { DemonstrationGarments } from './demonstration-garments';
import { DemonstrationProtocols } from './demonstration-protocols';
import { DemonstrationSheets } from './demonstration-sheets';
import { DemonstrationStaff } from './demonstration-staff';

/** The application and whoever fills it once; the running API does not hold this room. */
@Module({
  imports: [AppModule, AuthModule, GarmentsModule, MeasuringModule, MediaModule, PublishingModule],
  providers: [DemonstrationStaff, DemonstrationProtocols, DemonstrationSheets, DemonstrationGarments],
})
export class DemonstrationModule {}
