import { Module } from '@nestjs/common';
import { PublishedPictures } from './published-pictures.service';

@Module({ providers: [PublishedPictures], exports: [PublishedPictures] })
export class CatalogueModule {}
