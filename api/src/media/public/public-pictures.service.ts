import { Injectable } from '@nestjs/common';
import { PublishedPictures } from '../../catalogue/published-pictures.service';
import { notFound, Refusal } from '../../common/refusal';
import type { StoredForm } from '../images.service';
import { formKey, parseFormName } from '../store/picture-keys';
import { PictureStore } from '../store/picture-store';

/** Pictures for the public: only what a published version shows that is not withdrawn. Originals never leave. */
@Injectable()
export class PublicPictures {
  constructor(
    private readonly published: PublishedPictures,
    private readonly store: PictureStore,
  ) {}

  /** @throws Refusal 410 where it was withdrawn, 404 for everything else that is not shown */
  async find(imageId: string, name: string): Promise<StoredForm> {
    const form = parseFormName(name);
    const picture = form && (await this.published.find(imageId));
    if (picture?.state === 'withdrawn')
      throw new Refusal(410, 'picture.withdrawn', 'This picture has been withdrawn.');
    const shown = picture?.widths.includes(form?.widthPx ?? 0) ? form : null;
    const file = shown && (await this.store.find(formKey(imageId.toLowerCase(), shown)));
    if (!shown || !file) throw notFound('picture.unknown', 'picture');
    return { ...shown, file };
  }
}
