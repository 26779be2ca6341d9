import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { z } from 'zod';
import { InjectCatalogue } from '../common/catalogue-connection';
import { fromJson } from './json-column';

const Row = z.object({
  state: z.enum(['visible', 'withdrawn']),
  widths: z.preprocess(fromJson, z.array(z.number())),
});
export type PublishedPicture = z.output<typeof Row>;

/** Whether the public may see a picture: asked of the published tables each time, so that a withdrawal counts at once. */
@Injectable()
export class PublishedPictures {
  constructor(@InjectCatalogue() private readonly catalogue: DataSource) {}

  /** null: never published. A picture that a newer version leaves out is still shown by the frozen one. */
  async find(imageId: string): Promise<PublishedPicture | null> {
    if (!/^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(imageId)) return null;
    const rows: unknown[] = await this.catalogue.query(
      'SELECT state, widths FROM published_image WHERE image_id = ?',
      [imageId],
    );
    return rows.length > 0 ? Row.parse(rows[0]) : null;
  }
}
