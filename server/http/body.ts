import { isUtf8 } from 'node:buffer';
import express, { type RequestHandler } from 'express';
import { limits } from '../../shared/limits';
import { Refusal } from '../refusal';

const notUtf8 = new Refusal('malformed-json', 'The body is not valid UTF-8.');

const parse = express.json({
  limit: limits.bodyBytes,
  type: () => true,
  strict: false,
  verify: (_request, _response, bytes, encoding) => {
    if (encoding !== 'utf-8' && encoding !== 'utf8') {
      throw new Refusal('unsupported-media-type', 'JSON is written in UTF-8.');
    }
    if (!isUtf8(bytes)) throw notUtf8;
  },
});

const isJson = /^application\/json\s*(;|$)/i;

/** Reads a JSON body in UTF-8, bounded; anything else is a 415, 400 or 413. */
export const jsonBody: RequestHandler = (request, response, next) => {
  if (!isJson.test(request.headers['content-type'] ?? '')) {
    next(new Refusal('unsupported-media-type', 'Send the body as Content-Type: application/json.'));
    return;
  }
  parse(request, response, next);
};
