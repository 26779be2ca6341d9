import { pageHandle } from '../../app/page-handle';

export { NotFoundPage as Component } from '../../components/notices/not-found-page';

export const handle = pageHandle({
  head: () => ({
    title: 'Nothing is kept at this address',
    description: 'No page of the catalogue stands at this address.',
    canonicalPath: '/',
    unlisted: true,
  }),
  status: () => 404,
});
