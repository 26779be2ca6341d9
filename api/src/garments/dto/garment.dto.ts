import {
  Garment,
  GarmentPage,
  GarmentQuery,
  GarmentRecord,
  NewGarment,
  NewPart,
} from '@ellwand/shared/records/garment';
import { createZodDto } from 'nestjs-zod';

export class GarmentQueryDto extends createZodDto(GarmentQuery) {}
export class NewGarmentDto extends createZodDto(NewGarment) {}
export class GarmentRecordDto extends createZodDto(GarmentRecord) {}
export class NewPartDto extends createZodDto(NewPart) {}
export class GarmentDto extends createZodDto(Garment) {}
export class GarmentPageDto extends createZodDto(GarmentPage) {}
