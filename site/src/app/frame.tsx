import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useMatches, useNavigation } from 'react-router-dom';
import { endTakingOver } from '../components/diagram/hydration';
import { chooseUnit } from '../components/units/unit-store';
import { UnitSwitch } from '../components/units/unit-switch';
import { SiteLink } from '../components/ui/site-link';
import { museum } from '../config/museum';
import { paths } from '../config/paths';
import { isUnit } from '../lib/range-boxes';
import { documentTitle } from './document-title';
import { isPageHandle } from './page-handle';

/** What stands round every page: the way past the header, header, page, footer. */
export function Frame() {
  useUnitOfAddress();
  usePageChange();
  useEffect(endTakingOver, []);
  const waiting = useNavigation().state === 'loading';
  return (
    <>
      <a href="#content" className="skip-link">
        Skip to the content
      </a>
      <Header />
      <main id="content" tabIndex={-1} aria-busy={waiting} className={waiting ? 'page waiting' : 'page'}>
        <Outlet />
      </main>
      <Footer />
      <p role="status" className={waiting ? 'waiting-words' : 'sr-only'}>
        {waiting ? 'Fetching the page' : ''}
      </p>
      <ScrollRestoration />
    </>
  );
}

function Header() {
  const { pathname } = useLocation();
  const current = (path: string) => (pathname.startsWith(path) ? 'page' : undefined);
  return (
    <header className="site-header">
      <div className="wide site-header-row">
        <SiteLink
          to={paths.home()}
          className="site-name"
          aria-label={`${museum.name}: ${museum.catalogueName}`}
        >
          Larkmoor House <span>Museum of Dress</span>
        </SiteLink>
        <nav aria-label="Catalogue" className="site-nav">
          <SiteLink to={paths.search()} aria-current={current('/search')}>
            Search
          </SiteLink>
          <SiteLink to={paths.howWeMeasure()} aria-current={current('/how-we-measure')}>
            How we measure
          </SiteLink>
        </nav>
        <UnitSwitch />
      </div>
    </header>
  );
}

function Footer() {
  return (
    <footer className="site-footer">
      <div className="wide site-footer-row">
        <p>
          <strong>{museum.name}.</strong> Every garment here was measured by hand, once, inside, from
          fastening to fastening.
        </p>
        <nav aria-label="Help">
          <SiteLink to={paths.howWeMeasure()}>How to read the measurements</SiteLink>
          <a href={`mailto:${museum.email}`}>Write to the museum</a>
        </nav>
        <p className="text-ink-3">The catalogue is kept with Ellwand.</p>
      </div>
    </footer>
  );
}

/** A unit in the address wins over the remembered one, also when a link within the site brings it. */
function useUnitOfAddress() {
  const { search } = useLocation();
  useEffect(() => {
    const unit = new URLSearchParams(search).get('unit');
    if (isUnit(unit)) chooseUnit(unit);
  }, [search]);
}

/** On another page the title follows and the heading takes the focus; a changed filter leaves the focus alone. */
function usePageChange() {
  const { pathname, search } = useLocation();
  const matches = useMatches();
  const place = `${pathname} ${new URLSearchParams(search).get('page') ?? ''}`;
  const before = useRef(place);
  const last = [...matches].reverse().find(({ handle }) => isPageHandle(handle));
  const url = `${pathname}${search}`;
  useEffect(() => {
    if (last && isPageHandle(last.handle)) {
      const { title } = last.handle.head(last.loaderData, {
        url: new URL(url, location.origin),
        params: last.params,
      });
      document.title = documentTitle(title);
    }
    if (before.current === place) return;
    before.current = place;
    const heading = document.querySelector<HTMLElement>('main h1');
    heading?.setAttribute('tabindex', '-1');
    heading?.focus({ preventScroll: true });
  }, [last, place, url]);
}
