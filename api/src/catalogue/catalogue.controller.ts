import { Controller, Get, Header, Param, Query } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import type { GarmentFound } from '@ellwand/shared/records/site-catalogue';
import { ZodResponse } from 'nestjs-zod';
import { Public } from '../common/public.decorator';
import { notFound, Refusal } from '../common/refusal';
import {
  FrontDto,
  KindsDto,
  NumberParam,
  PointsDto,
  PublishedGarmentDto,
  SearchAnswerDto,
  SearchQueryDto,
  VersionParam,
} from './dto/catalogue.dto';
import { PublishedGarments } from './published-garments.service';
import { CatalogueSearch } from './search/catalogue-search.service';
import { kindVocabulary, pointVocabulary } from './vocabulary';

/**
 * What the public may read. Caches may keep every answer and ask each time whether it still holds: the tag is a
 * sum of the answer itself, so that nothing withdrawn outlives its withdrawal.
 */
@ApiTags('Public catalogue')
@Controller('catalogue')
@Public()
export class CatalogueController {
  constructor(
    private readonly searching: CatalogueSearch,
    private readonly garments: PublishedGarments,
  ) {}

  @Get('garments')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: SearchAnswerDto })
  search(@Query() query: SearchQueryDto) {
    return this.searching.search(query);
  }

  @Get('garments/:number')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: PublishedGarmentDto })
  async garment(@Param() { number }: NumberParam) {
    return shown(await this.garments.find(number));
  }

  @Get('garments/:number/v/:version')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: PublishedGarmentDto })
  async version(@Param() { number, version }: VersionParam) {
    return shown(await this.garments.find(number, version));
  }

  @Get('front')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: FrontDto })
  async front() {
    const { total, kinds, newest } = await this.searching.front();
    return { total, kinds: [...kinds], newest: [...newest] };
  }

  @Get('points')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: PointsDto })
  points() {
    return pointVocabulary;
  }

  @Get('kinds')
  @Header('Cache-Control', 'public, no-cache')
  @ZodResponse({ status: 200, type: KindsDto })
  kinds() {
    return kindVocabulary;
  }
}

/** @throws Refusal 410 with the public notice, or 404, the same for what was never published as for what is not there */
function shown(found: GarmentFound): PublishedGarment {
  if (found.found === 'garment') return found.garment;
  if (found.found === 'nothing') throw notFound('garment.unknown', 'garment');
  throw new Refusal(410, 'garment.withdrawn', found.notice.notice, { ...found.notice });
}
