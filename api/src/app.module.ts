import { Module } from '@nestjs/common';
import { AuditModule } from './audit/audit.module';
import { AuthModule } from './auth/auth.module';
import { CatalogueModule } from './catalogue/catalogue.module';
import { CommonModule } from './common/common.module';
import { ConfigModule } from './config/config.module';
import { DatabaseModule } from './database/database.module';
import { GarmentsModule } from './garments/garments.module';
import { HealthModule } from './health/health.module';
import { MailModule } from './mail/mail.module';
import { MeasuringModule } from './measuring/measuring.module';
import { MediaModule } from './media/media.module';
import { OpenApiModule } from './openapi/openapi.module';
import { PagesModule } from './pages/pages.module';
import { PublishingModule } from './publishing/publishing.module';
import { UsersModule } from './users/users.module';

/** The floor plan: each import is a room, named after the work done in it. */
@Module({
  imports: [
    ConfigModule,
    CommonModule,
    DatabaseModule,
    HealthModule,
    AuthModule,
    UsersModule,
    MailModule,
    AuditModule,
    GarmentsModule,
    MeasuringModule,
    MediaModule,
    PublishingModule,
    CatalogueModule,
    OpenApiModule,
    PagesModule,
  ],
})
export class AppModule {}
