import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { Inbox } from './inbox';
import { inboxPage, inboxStyle, letterPage, noLetterPage } from './inbox-page';

/**
 * The inbox as pages on loopback, and as `/letters.json` for programs. Only whoever asks this machine by its own
 * name is answered: a foreign site whose name points here must not read one-time links.
 */
export function showLetters(inbox: Inbox): Server {
  return createServer((request, response) => {
    response.setHeader(
      'Content-Security-Policy',
      "default-src 'none'; style-src 'self'; frame-ancestors 'none'",
    );
    response.setHeader('X-Content-Type-Options', 'nosniff');
    response.setHeader('Referrer-Policy', 'no-referrer');
    response.setHeader('Cache-Control', 'no-store');
    if (!asksThisMachine(request)) return send(response, 403, 'text/plain', 'Ask for 127.0.0.1.');
    answer(inbox, request.url ?? '/', response);
  });
}

function asksThisMachine({ headers }: IncomingMessage): boolean {
  return /^(127\.0\.0\.1|localhost)(:\d+)?$/.test(headers.host ?? '');
}

function answer(inbox: Inbox, url: string, response: ServerResponse): void {
  if (url === '/') return send(response, 200, 'text/html', inboxPage(inbox.all));
  if (url === '/style.css') return send(response, 200, 'text/css', inboxStyle);
  if (url === '/letters.json') return send(response, 200, 'application/json', JSON.stringify(inbox.all));
  if (url === '/favicon.ico') return void response.writeHead(204).end();
  const letter = inbox.find(/^\/letters\/([\w-]+)$/.exec(url)?.[1] ?? '');
  if (!letter) return send(response, 404, 'text/html', noLetterPage());
  send(response, 200, 'text/html', letterPage(letter));
}

function send(response: ServerResponse, status: number, type: string, body: string): void {
  response.writeHead(status, { 'Content-Type': `${type}; charset=utf-8` }).end(body);
}
