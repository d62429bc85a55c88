import { createHash } from 'node:crypto';
import type { RequestHandler } from 'express';
import helmet from 'helmet';

const hashOf = (style: string) => `'sha256-${createHash('sha256').update(style).digest('base64')}'`;

/** Hashes of the inline styles of a page: react-native-web needs the empty one for its own sheet. */
export const styleHashes = (html: string): string[] => [
  hashOf(''),
  ...[...html.matchAll(/<style[^>]*>([\s\S]*?)<\/style>/g)].map(([, style = '']) => hashOf(style)),
];

interface Options {
  /** What `style-src` allows beside 'self'. */
  readonly styles: readonly string[];
  readonly https: boolean;
}

/** Strict headers: nothing from elsewhere, no frames, no inline script. */
export const securityHeaders = ({ styles, https }: Options): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        styleSrc: ["'self'", ...styles],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(https ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: https && { maxAge: 31_536_000 },
    referrerPolicy: { policy: 'no-referrer' },
    crossOriginEmbedderPolicy: false,
    xFrameOptions: { action: 'deny' },
  });
