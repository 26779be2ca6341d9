import { Injectable } from '@nestjs/common';
import type { GarmentPage, GarmentQuery } from '@ellwand/shared/records/garment';
import type { z } from 'zod';
import { Work } from '../common/work';
import { SheetRow } from '../measuring/sheets/sheet.entity';
import { ImageRow } from '../media/image.entity';
import { GarmentRow } from './garment.entity';
import { PartRow } from './part.entity';

const orders = {
  updated: { 'garment.updatedAt': 'DESC', 'garment.id': 'DESC' },
  number: { 'garment.ownNumber': 'ASC' },
  title: { 'garment.title': 'ASC', 'garment.id': 'ASC' },
} as const;

interface Counted {
  garmentId: string;
  count: string;
}

/** The Workroom's list of garments. */
@Injectable()
export class GarmentListService {
  constructor(private readonly work: Work) {}

  async list(query: z.output<typeof GarmentQuery>): Promise<z.output<typeof GarmentPage>> {
    const select = this.work.reader.createQueryBuilder(GarmentRow, 'garment').where('1 = 1');
    if (query.stage) select.andWhere('garment.stage = :stage', { stage: query.stage });
    if (query.q) {
      const looked = [
        'garment.ownNumber',
        'garment.title',
        "JSON_VALUE(garment.record, '$.maker') COLLATE utf8mb4_uca1400_ai_ci",
      ];
      const like = { like: `%${escapeLike(query.q)}%` };
      select.andWhere(`(${looked.map((column) => `${column} LIKE :like`).join(' OR ')})`, like);
    }
    const [garments, total] = await select
      .orderBy(orders[query.sort])
      .offset((query.page - 1) * query.size)
      .limit(query.size)
      .getManyAndCount();
    const ids = garments.map((garment) => garment.id);
    const [sheets, pictures, first] = await Promise.all([
      this.openSheets(ids),
      this.pictures(ids),
      this.firstImages(ids),
    ]);
    return {
      total,
      page: query.page,
      size: query.size,
      items: garments.map((garment) => ({
        id: garment.id,
        ownNumber: garment.ownNumber,
        title: garment.title,
        kind: garment.kind,
        date: garment.record.date,
        stage: garment.stage,
        isPublic: garment.isPublic,
        publicNumber: garment.publicNumber,
        openSheets: sheets.get(garment.id) ?? 0,
        pictures: pictures.get(garment.id) ?? 0,
        firstImageId: first.get(garment.id) ?? null,
        updatedAt: garment.updatedAt.toISOString(),
      })),
    };
  }

  private async openSheets(ids: string[]): Promise<Map<string, number>> {
    if (ids.length === 0) return new Map();
    const rows = await this.work.reader
      .createQueryBuilder(SheetRow, 'sheet')
      .innerJoin(PartRow, 'part', 'part.id = sheet.partId')
      .select('part.garmentId', 'garmentId')
      .addSelect('COUNT(*)', 'count')
      .where("part.garmentId IN (:...ids) AND sheet.state = 'open'", { ids })
      .groupBy('part.garmentId')
      .getRawMany<Counted>();
    return new Map(rows.map((row) => [row.garmentId, Number(row.count)]));
  }

  private async pictures(ids: string[]): Promise<Map<string, number>> {
    if (ids.length === 0) return new Map();
    const rows = await this.work.reader
      .createQueryBuilder(ImageRow, 'image')
      .select('image.garmentId', 'garmentId')
      .addSelect('COUNT(*)', 'count')
      .where("image.garmentId IN (:...ids) AND image.deletedAt IS NULL AND image.state <> 'refused'", { ids })
      .groupBy('image.garmentId')
      .getRawMany<Counted>();
    return new Map(rows.map((row) => [row.garmentId, Number(row.count)]));
  }

  private async firstImages(ids: string[]): Promise<Map<string, string>> {
    if (ids.length === 0) return new Map();
    const images = await this.work.reader
      .createQueryBuilder(ImageRow, 'image')
      .where("image.garmentId IN (:...ids) AND image.deletedAt IS NULL AND image.state = 'ready'", { ids })
      .orderBy({ 'image.position': 'DESC', 'image.id': 'DESC' })
      .getMany();
    // Later entries of a map win, so the lowest position is kept.
    return new Map(images.map((image) => [image.garmentId, image.id]));
  }
}

/** `%` and `_` in what was typed mean themselves. */
function escapeLike(text: string): string {
  return text.replace(/[\\%_]/g, (sign) => `\\${sign}`);
}
