import { isIPv6 } from 'node:net';
import type { Request } from 'express';

/**
 * What stands for the place a request comes from. Of IPv6 a household or a firm has a /64 to itself, 2⁶⁴ addresses:
 * only the network counts.
 */
export function addressOf(request: Pick<Request, 'ip'>): string {
  const address = (request.ip ?? 'unknown').replace(/^::ffff:(?=\d+\.)/, '');
  return isIPv6(address) ? networkOf(address) : address;
}

/** The first four groups, written out: `2001:db8::1` → `2001:db8:0:0`. */
function networkOf(address: string): string {
  const [head = '', tail] = (address.split('%')[0] ?? '').toLowerCase().split('::');
  const first = head === '' ? [] : head.split(':');
  const last = tail === undefined || tail === '' ? [] : tail.split(':');
  const zeros =
    tail === undefined ? [] : Array<string>(Math.max(0, 8 - first.length - last.length)).fill('0');
  return [...first, ...zeros, ...last].slice(0, 4).join(':');
}
