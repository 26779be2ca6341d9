import { Controller, Get, Param, Req, Res } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { Public } from '../../common/public.decorator';
import { sendForm } from '../send-form';
import { PublicPictures } from './public-pictures.service';

/** Pictures as pages show them, at `/media/<id>/<width>.avif` and `.jpg`. */
@ApiTags('Public catalogue')
@Controller('media')
export class PublicPicturesController {
  constructor(private readonly pictures: PublicPictures) {}

  @Get(':imageId/:form')
  @Public()
  async picture(
    @Param('imageId') imageId: string,
    @Param('form') form: string,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    // Kept by caches, but asked about each time: a withdrawal counts at once.
    await sendForm(request, response, await this.pictures.find(imageId, form), 'public, no-cache');
  }
}
