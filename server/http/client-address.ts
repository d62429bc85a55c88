import type { IncomingMessage } from 'node:http';
import type { RequestHandler } from 'express';
import { contains, parseAddress, writeAddress, type Address, type Network } from './networks';

declare module 'express-serve-static-core' {
  interface Locals {
    /** Where the call comes from, as far as it is known; see `clientAddress`. */
    address?: string;
  }
}

/** An entry of X-Forwarded-For: an address, by some proxies with the port it came from. */
function entry(text: string): Address | undefined {
  const [, inBrackets, dotted] =
    /^\[([^\]]*)\](?::\d{1,5})?$|^([\d.]+):\d{1,5}$/.exec(text.trim()) ?? [];
  return parseAddress(inBrackets ?? dotted ?? text.trim());
}

/**
 * The address that a call is counted, slowed down and logged by: the peer's, and only where that is
 * a trusted proxy what it forwards. X-Forwarded-For is read from the right, each proxy having added
 * the peer it saw, up to the first address that is no trusted proxy. What stands left of that
 * anybody can have written. An entry that is no address ends the reading at the proxy that sent it.
 */
export function clientAddress(
  peer: string | undefined,
  forwarded: string | undefined,
  proxies: readonly Network[],
): string {
  let nearest = parseAddress(peer ?? '');
  if (!nearest) return peer ?? '';
  const isTrusted = (address: Address) => proxies.some((proxy) => contains(proxy, address));
  for (const text of (forwarded ?? '').split(',').reverse()) {
    if (!isTrusted(nearest)) break;
    const before = entry(text);
    if (!before) break;
    nearest = before;
  }
  return writeAddress(nearest);
}

const forwardedOf = ({ headers }: IncomingMessage) => {
  const header = headers['x-forwarded-for'];
  return Array.isArray(header) ? header.join(',') : header;
};

/**
 * Notes where each call comes from. Express's own `trust proxy` stays off: it would also believe
 * X-Forwarded-Host and X-Forwarded-Proto, which PUBLIC_URL answers for.
 */
export const noteAddress =
  (proxies: readonly Network[]): RequestHandler =>
  (request, response, next) => {
    response.locals.address = clientAddress(
      request.socket.remoteAddress,
      forwardedOf(request),
      proxies,
    );
    next();
  };
