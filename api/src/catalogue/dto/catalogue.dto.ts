import { kindIds } from '@ellwand/shared/points/kinds';
import { handlingSteps } from '@ellwand/shared/points/point';
import { CatalogueCard, PublishedGarment, SearchAnswer } from '@ellwand/shared/records/published-garment';
import { SearchQuery } from '@ellwand/shared/records/search-query';
import { createZodDto } from 'nestjs-zod';
import { z } from 'zod';

export class SearchQueryDto extends createZodDto(SearchQuery) {}
export class SearchAnswerDto extends createZodDto(SearchAnswer) {}
export class PublishedGarmentDto extends createZodDto(PublishedGarment) {}

export class NumberParam extends createZodDto(z.object({ number: z.string().max(80) })) {}
export class VersionParam extends createZodDto(
  z.object({ number: z.string().max(80), version: z.coerce.number().int().min(1) }),
) {}

export class FrontDto extends createZodDto(
  z.object({
    total: z.number().int(),
    kinds: z.array(z.object({ kind: z.string(), count: z.number().int() })),
    newest: z.array(CatalogueCard),
  }),
) {}

export class PointsDto extends createZodDto(
  z.object({
    groups: z.array(z.object({ id: z.string(), label: z.string() })),
    items: z.array(
      z.object({
        id: z.string(),
        group: z.string(),
        name: z.string(),
        definition: z.string(),
        from: z.string(),
        to: z.string(),
        side: z.enum(['inside', 'outside']),
        how: z.enum(['round', 'straight', 'curve', 'flat-doubled']),
        handlingStep: z.enum(handlingSteps),
        kinds: z.array(z.enum(kindIds)),
        watchFor: z.string(),
      }),
    ),
  }),
) {}

export class KindsDto extends createZodDto(
  z.object({ items: z.array(z.object({ id: z.string(), singular: z.string(), plural: z.string() })) }),
) {}
