import { env } from '@/lib/env';

/**
 * The client's address, by which tries are counted. With n reverse proxies of our own in front, each of
 * which appends whom it heard from, it is the n-th of X-Forwarded-For from the right; what stands further
 * left was written by the client. Without one, Next.js puts the socket's address there where the client
 * wrote none: a client that writes its own can change it, and the count by account still holds.
 */
export function clientAddress(headers: { get(name: string): string | null }): string {
  const hops = (headers.get('x-forwarded-for') ?? '')
    .split(',')
    .map((hop) => hop.trim())
    .filter((hop) => hop !== '');
  const address = hops[Math.max(0, hops.length - Math.max(1, env().trustedProxies))];
  return address && address.length <= 64 ? address : 'unknown';
}
