import { Readiness } from '@ellwand/shared/records/publishing';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import { withinWorkroom } from '../../../config/paths.js';
import type { ProblemError } from '../../../lib/problem-error.js';

/** What still keeps a record from review: a sentence each, with the place to mend it. */
export function NotReady({ problem }: { readonly problem: ProblemError }) {
  const readiness = z.array(Readiness).safeParse(problem.member('readiness'));
  return (
    <div role="alert" className="max-w-md rounded-sm border border-madder bg-madder-tint p-3 text-table">
      <p className="font-medium text-madder">Not ready for review yet</p>
      {readiness.success ? (
        <ul className="mt-1 list-disc space-y-1 pl-5">
          {readiness.data.map(({ sentence, href }) => (
            <li key={sentence}>
              {href ? (
                <Link className="underline" to={withinWorkroom(href)}>
                  {sentence}
                </Link>
              ) : (
                sentence
              )}
            </li>
          ))}
        </ul>
      ) : (
        <p>{problem.message}</p>
      )}
    </div>
  );
}
