import type { House } from './house.js';
import { Refusal } from './refuse.js';

export interface Call {
  readonly house: House;
  readonly params: Readonly<Record<string, string>>;
  readonly query: URLSearchParams;
  readonly body: unknown;
  readonly form: FormData | null;
  /** From If-Match. */
  readonly version: number | null;
}
export type Route = (
  call: Call & { readonly params: { readonly id: string } },
) => Response | Promise<Response>;
/** "VERB /path/:id" to what answers it. */
export type Routes = Readonly<Record<string, Route>>;

export const json = (value: unknown, status = 200): Response =>
  new Response(JSON.stringify(value), { status, headers: { 'Content-Type': 'application/json' } });
export const nothing = (): Response => new Response(null, { status: 204 });

/** Compare and set, as the API does it. */
export function matched(current: number, sent: number | null, changedBy = 'Imogen Sallow'): void {
  if (sent === null) throw new Refusal(428, 'version.required');
  if (sent !== current) {
    throw new Refusal(
      412,
      'version.stale',
      { current, changedBy, changedAt: '2026-12-01T14:32:00.000Z' },
      'Somebody saved in between.',
    );
  }
}

/** Routes that need nobody signed in. */
const open = [
  'POST /session',
  'POST /session/refresh',
  'POST /invitations/',
  'POST /first-administrator',
  'DELETE /session',
];

function paramsOf(pattern: string, path: string): Record<string, string> | null {
  const names: string[] = [];
  const source = pattern.replaceAll(/:(\w+)/g, (_all, name: string) => {
    names.push(name);
    return '([^/]+)';
  });
  const found = new RegExp(`^${source}$`).exec(path);
  return found && Object.fromEntries(names.map((name, index) => [name, found[index + 1] ?? '']));
}

async function bodyOf(request: Request): Promise<{ body: unknown; form: FormData | null }> {
  const type = request.headers.get('Content-Type') ?? '';
  if (type.startsWith('multipart/')) return { body: null, form: await request.formData() };
  const text = await request.text();
  return { body: text ? (JSON.parse(text) as unknown) : undefined, form: null };
}

/** Answers one request from the house in memory. */
export function makeHandler(house: House, routes: Routes) {
  return async (request: Request): Promise<Response> => {
    const url = new URL(request.url);
    const call = `${request.method} ${url.pathname.replace('/api/v1', '')}`;
    try {
      if (!house.signedIn && !open.some((one) => call.startsWith(one)))
        throw new Refusal(401, 'session.ended');
      for (const [pattern, route] of Object.entries(routes)) {
        const params = paramsOf(pattern, call);
        if (!params) continue;
        const version = /"(\d+)"/.exec(request.headers.get('If-Match') ?? '')?.[1];
        const asked = {
          house,
          params: { id: '', ...params },
          query: url.searchParams,
          version: version === undefined ? null : Number(version),
        };
        return await route({ ...asked, ...(await bodyOf(request)) });
      }
      throw new Refusal(404, 'route.unknown', {}, `No route for ${call}`);
    } catch (error) {
      if (error instanceof Refusal) return error.answer();
      throw error;
    }
  };
}
