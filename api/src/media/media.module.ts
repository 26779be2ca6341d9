import { Module } from '@nestjs/common';
import { CatalogueModule } from '../catalogue/catalogue.module';
import { GarmentsModule } from '../garments/garments.module';
import { ImageEngine } from './engine/image-engine';
import { FormsClaims } from './forms/forms-claims';
import { FormsMaker } from './forms/forms-maker';
import { ImagesController } from './images.controller';
import { ImagesService } from './images.service';
import { ImageIntake } from './intake/image-intake';
import { UploadInterceptor } from './intake/upload.interceptor';
import { PublicPicturesController } from './public/public-pictures.controller';
import { PublicPictures } from './public/public-pictures.service';
import { PictureStore } from './store/picture-store';

@Module({
  imports: [GarmentsModule, CatalogueModule],
  controllers: [ImagesController, PublicPicturesController],
  providers: [
    FormsClaims,
    FormsMaker,
    ImageEngine,
    ImageIntake,
    ImagesService,
    PictureStore,
    PublicPictures,
    UploadInterceptor,
  ],
  exports: [ImageIntake, FormsMaker],
})
export class MediaModule {}
