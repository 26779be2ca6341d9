import { Module } from '@nestjs/common';
import { CatalogueController } from './catalogue.controller';
import { PublishedGarments } from './published-garments.service';
import { PublishedPictures } from './published-pictures.service';
import { CatalogueSearch } from './search/catalogue-search.service';
import { IndexUpkeep } from './search/index-upkeep';
import { PublishedReader } from './search/published-reader';
import { InProcessCatalogue } from './site-catalogue.service';

@Module({
  controllers: [CatalogueController],
  providers: [
    CatalogueSearch,
    IndexUpkeep,
    InProcessCatalogue,
    PublishedGarments,
    PublishedPictures,
    PublishedReader,
  ],
  exports: [InProcessCatalogue, PublishedPictures],
})
export class CatalogueModule {}
