import { useRouteError } from 'react-router-dom';
import { Button, ButtonLink } from '../components/ui/button.js';
import { Page } from '../components/ui/page.js';
import { errorSentence, Waiting } from '../components/ui/states.js';
import { paths } from '../config/paths.js';

export function Astray() {
  return (
    <Page title="There is nothing at this address">
      <p className="mb-4 text-table">
        It may have been copied in part, or the thing it named is no longer here.
      </p>
      <ButtonLink tone="action" to={paths.garments()}>
        Go to the garments
      </ButtonLink>
    </Page>
  );
}

/** A fault of the program. Readings and drafts are kept on the device, so loading again loses nothing. */
export function Broken() {
  const error = useRouteError();
  return (
    <main className="mx-auto max-w-page p-6">
      <h1 className="title text-title-34">This page broke</h1>
      <p className="my-4 text-table">
        {errorSentence(error)} Readings that were kept on this device are still there.
      </p>
      <Button tone="action" onClick={() => window.location.reload()}>
        Load the page again
      </Button>
    </main>
  );
}

/** While the first page's own code is on its way. */
export function Opening() {
  return (
    <main className="mx-auto max-w-page p-6">
      <h1 className="sr-only">Ellwand Workroom</h1>
      <Waiting label="Opening the Workroom" />
    </main>
  );
}
