import { Module } from '@nestjs/common';
import { CatalogueModule } from '../catalogue/catalogue.module';
import { BUILT_FOLDERS, builtFolders } from './built-folders';
import { PagesController } from './pages.controller';
import { SiteBuild } from './site-build';
import { SitePages } from './site-pages.service';
import { WorkroomController } from './workroom.controller';

/** The last room on the floor plan: whatever no other room answers is a page. */
@Module({
  imports: [CatalogueModule],
  controllers: [WorkroomController, PagesController],
  providers: [SiteBuild, SitePages, { provide: BUILT_FOLDERS, useValue: builtFolders }],
})
export class PagesModule {}
