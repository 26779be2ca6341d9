import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import { ZodResponse } from 'nestjs-zod';
import { type Actor, CurrentActor } from '../common/actor';
import { IdParam } from '../common/dto/id.dto';
import { IfMatch } from '../common/if-match';
import { Requires } from '../common/requires.decorator';
import { GarmentDto } from '../garments/dto/garment.dto';
import { PreviewDto, ReturnReasonDto, ReviewDto, RevisionsDto, WithdrawalDto } from './dto/publishing.dto';
import { PublishingService } from './publishing.service';
import { ReviewService } from './review/review.service';

@ApiTags('Publishing')
@Controller('workroom/garments/:id')
export class PublishingController {
  constructor(
    private readonly publishing: PublishingService,
    private readonly reviews: ReviewService,
  ) {}

  @Get('review')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: ReviewDto })
  review(@Param() { id }: IdParam, @CurrentActor() actor: Actor) {
    return this.reviews.review(id, actor);
  }

  @Get('preview')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: PreviewDto })
  preview(@Param() { id }: IdParam) {
    return this.reviews.preview(id);
  }

  @Get('revisions')
  @Requires('garment:read')
  @ZodResponse({ status: 200, type: RevisionsDto })
  revisions(@Param() { id }: IdParam) {
    return this.reviews.revisions(id);
  }

  @Post('submit')
  @HttpCode(200)
  @Requires('record:submit')
  @ZodResponse({ status: 200, type: GarmentDto })
  submit(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.publishing.submit(id, seen, actor);
  }

  @Post('return')
  @HttpCode(200)
  @Requires('record:review')
  @ZodResponse({ status: 200, type: GarmentDto })
  return(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() { reason }: ReturnReasonDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.publishing.return(id, seen, reason, actor);
  }

  @Post('approve')
  @HttpCode(200)
  @Requires('record:review')
  @ZodResponse({ status: 200, type: GarmentDto })
  approve(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.publishing.approve(id, seen, actor);
  }

  @Post('publish')
  @HttpCode(200)
  @Requires('record:publish')
  @ZodResponse({ status: 200, type: GarmentDto })
  publish(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.publishing.publish(id, seen, actor);
  }

  @Post('withdraw')
  @HttpCode(200)
  @Requires('record:withdraw')
  @ZodResponse({ status: 200, type: GarmentDto })
  withdraw(
    @Param() { id }: IdParam,
    @IfMatch() seen: number,
    @Body() withdrawal: WithdrawalDto,
    @CurrentActor() actor: Actor,
  ) {
    return this.publishing.withdraw(id, seen, withdrawal, actor);
  }

  @Post('revise')
  @HttpCode(200)
  @Requires('garment:write')
  @ZodResponse({ status: 200, type: GarmentDto })
  revise(@Param() { id }: IdParam, @IfMatch() seen: number, @CurrentActor() actor: Actor) {
    return this.publishing.revise(id, seen, actor);
  }
}
