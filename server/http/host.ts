import type { Request, RequestHandler } from 'express';
import { Refusal } from '../refusal';

/** Names of this machine, for itself. */
const loopback = ['localhost', '127.0.0.1'];
const impliedPorts: Readonly<Record<string, string>> = { 'http:': '80', 'https:': '443' };

interface Place {
  readonly publicUrl: string;
  /** The port that the server listens on. */
  readonly port: number;
  readonly isProduction: boolean;
}

/**
 * The hosts the service answers under: that of PUBLIC_URL; outside production also this machine by
 * its own names, at that port and at the one it listens on. In lower case, with and without a port
 * that the protocol implies.
 */
export function ownHosts({ publicUrl, port, isProduction }: Place): ReadonlySet<string> {
  const url = new URL(publicUrl);
  const implied = impliedPorts[url.protocol];
  const publicPort = url.port || implied;
  const places = [[url.hostname, publicPort]];
  for (const at of isProduction ? [] : [publicPort, `${port}`]) {
    places.push(...loopback.map((name) => [name, at]));
  }
  return new Set(
    places.flatMap(([name = '', at]) => [`${name}:${at}`, ...(at === implied ? [name] : [])]),
  );
}

/** Hosts that a request names: in its header and, in absolute form (RFC 9112 §3.2.2), its target. */
function* hostsNamed({ headers, url }: Request): Generator<string> {
  yield headers.host ?? '';
  const target = /^[a-z][a-z0-9+.-]*:\/\/([^/?#]*)/i.exec(url)?.[1];
  if (target !== undefined) yield target;
}

/**
 * Refuses requests for another host, before cookies, credentials or bodies are looked at: a name
 * that somebody else pointed at this address (DNS rebinding) leads nowhere. `anyHost` has the paths
 * of operations that answer under any.
 */
export const requireOwnHost =
  (hosts: ReadonlySet<string>, anyHost: ReadonlySet<string>): RequestHandler =>
  (request, _response, next) => {
    if (anyHost.has(request.path)) return next();
    if ((request.headersDistinct.host ?? []).length > 1) {
      throw new Refusal('invalid-request', 'Name one Host (RFC 9112 §3.2).');
    }
    for (const host of hostsNamed(request)) {
      if (!hosts.has(host.toLowerCase())) {
        throw new Refusal('misdirected-request', 'Nothing here answers under that name.');
      }
    }
    next();
  };
