import {
  Body,
  Controller,
  Delete,
  Get,
  HttpCode,
  Param,
  Patch,
  Post,
  Req,
  Res,
  UploadedFile,
  UseInterceptors,
} from '@nestjs/common';
import { ApiBody, ApiConsumes, ApiTags } from '@nestjs/swagger';
import type { Request, Response } from 'express';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { IdParam } from '../common/dto/id.dto';
import { IfMatch } from '../common/if-match';
import { LimitedAs } from '../common/limits';
import { Refusal } from '../common/refusal';
import { Requires } from '../common/requires.decorator';
import { FormParam, ImageChangeDto, ImageDto, ImageFieldsDto, ImagesDto } from './dto/image.dto';
import { toImage } from './image-view';
import { ImagesService } from './images.service';
import { ImageIntake } from './intake/image-intake';
import { type Upload, UploadInterceptor } from './intake/upload.interceptor';
import { sendForm } from './send-form';

@ApiTags('Pictures')
@Controller('workroom')
export class ImagesController {
  constructor(
    private readonly images: ImagesService,
    private readonly intake: ImageIntake,
  ) {}

  @Get('garments/:id/images')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: ImagesDto })
  list(@Param() { id }: IdParam) {
    return this.images.list(id);
  }

  @Post('garments/:id/images')
  @Requires('image:write')
  @LimitedAs('upload')
  @UseInterceptors(UploadInterceptor)
  @ApiConsumes('multipart/form-data')
  @ApiBody({ type: ImageFieldsDto, description: 'Beside these texts, the picture in the field `file`.' })
  @ZodResponse({ status: 201, type: ImageDto })
  async add(
    @Param() { id }: IdParam,
    @UploadedFile() file: Upload | undefined,
    @Body() fields: ImageFieldsDto,
    @CurrentActor() actor: Actor,
  ) {
    if (!file) throw new Refusal(400, 'image.missing', 'Send the picture in the field `file`.');
    return toImage(
      await this.intake.acceptUpload(actor, id, { path: file.path, name: file.originalname }, fields),
    );
  }

  @Patch('images/:id')
  @Requires('image:write')
  @ZodResponse({ status: 200, type: ImageDto })
  change(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() change: ImageChangeDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.images.change(id, seen, change, actor);
  }

  @Delete('images/:id')
  @HttpCode(204)
  @Requires('image:write')
  remove(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor): Promise<void> {
    return this.images.remove(id, seen, actor);
  }

  @Get('images/:id/forms/:form')
  @Requires('garment:read')
  async form(
    @Param() { id, form }: FormParam,
    @Req() request: Request,
    @Res() response: Response,
  ): Promise<void> {
    await sendForm(request, response, await this.images.form(id, form), 'no-store');
  }
}
