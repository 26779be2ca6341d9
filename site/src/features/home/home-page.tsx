import { Form, useLoaderData, useSearchParams } from 'react-router-dom';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { isUnit } from '../../lib/range-boxes';
import { counted } from '../../lib/words';
import { GarmentCard } from '../../components/ui/garment-card';
import type { HomeFound } from './home-loader';
import { KindEntries } from './kind-entries';
import { LivingDrawing } from './living-drawing';

/** The first page: what is here, the way in by words, by kind, and by what was measured last. */
export function HomePage() {
  const { total, kinds, newest, subject } = useLoaderData<HomeFound>();
  return (
    <>
      <section className="wide opening">
        <div className="opening-words">
          <h1>Historic dress, measured by hand, from the inside</h1>
          <p className="opening-more">
            {counted(total, 'garment')}, each with its diagram, its measurements and how far they can be
            trusted. Read them in millimetres, centimetres or inches.
          </p>
          <HomeSearch />
          <p>
            <SiteLink className="link" to={paths.search('measure=waist%3A560..620')}>
              Waist from 560 to 620 mm
            </SiteLink>{' '}
            is one way to begin.
          </p>
        </div>
        <LivingDrawing subject={subject} />
      </section>
      <KindEntries kinds={kinds} />
      {newest.length > 0 && (
        <section className="wide newest">
          <h2>Newest measured</h2>
          <ul className="cards cards-four">
            {newest.map((card) => (
              <li key={card.number}>
                <GarmentCard
                  card={card}
                  heading="h3"
                  sizes="(width >= 64rem) 290px, (width >= 40rem) 45vw, 38vw"
                />
              </li>
            ))}
          </ul>
        </section>
      )}
    </>
  );
}

function HomeSearch() {
  const [params] = useSearchParams();
  const unit = params.get('unit');
  return (
    <search>
      <Form method="get" action={paths.search()} className="opening-search">
        {isUnit(unit) && <input type="hidden" name="unit" value={unit} />}
        <label htmlFor="home-words" className="label">
          Words in title, description, maker or label
        </label>
        <div className="search-row">
          <input id="home-words" name="q" type="search" className="input" />
          <button type="submit" className="button">
            Search
          </button>
        </div>
      </Form>
    </search>
  );
}
