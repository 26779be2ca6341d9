import { PublishedDocument } from '@ellwand/shared/records/published-garment';
import { Review, ReturnReason, Revisions, Withdrawal } from '@ellwand/shared/records/publishing';
import { createZodDto } from 'nestjs-zod';

export class ReturnReasonDto extends createZodDto(ReturnReason) {}
export class WithdrawalDto extends createZodDto(Withdrawal) {}
export class ReviewDto extends createZodDto(Review) {}
export class RevisionsDto extends createZodDto(Revisions) {}
export class PreviewDto extends createZodDto(PublishedDocument) {}
