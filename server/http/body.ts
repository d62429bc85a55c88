import { isUtf8 } from 'node:buffer';
import express, { type Request, type RequestHandler, type Response } from 'express';
import { limits } from '../../shared/limits';
import { Refusal } from '../refusal';
import { faultsAtMost } from './faults';
import { silentAlterations } from './json-text';

const isJson = /^application\/json\s*(?:;\s*charset\s*=\s*"?([^\s;"]+)"?\s*)?$/i;
const bytes = express.raw({ limit: limits.bodyBytes, type: () => true, inflate: false });

function requireJson(type: string, encoding: string): void {
  const [isRight, charset = 'utf-8'] = isJson.exec(type) ?? [];
  if (isRight === undefined) {
    throw new Refusal('unsupported-media-type', 'Send the body as Content-Type: application/json.');
  }
  if (!/^utf-?8$/i.test(charset)) {
    throw new Refusal('unsupported-media-type', 'JSON is written in UTF-8.');
  }
  if (encoding.toLowerCase() !== 'identity') {
    throw new Refusal('unsupported-media-type', 'Send the body without Content-Encoding.');
  }
}

function parse(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    const at = error instanceof Error ? /position (\d+)/.exec(error.message)?.[1] : undefined;
    throw new Refusal('malformed-json', at && `It breaks at character ${Number(at) + 1}.`);
  }
}

function read(body: unknown): unknown {
  const buffer = Buffer.isBuffer(body) ? body : Buffer.alloc(0);
  if (!isUtf8(buffer)) throw new Refusal('malformed-json', 'The body is not valid UTF-8.');
  const text = buffer.toString();
  const value = parse(text);
  const errors = silentAlterations(text).slice(0, faultsAtMost);
  if (errors.length > 0) {
    throw new Refusal('invalid-request', 'Parts of the body would be altered silently.', errors);
  }
  return value;
}

const collect = (request: Request, response: Response) =>
  new Promise<void>((resolve, reject) => {
    bytes(request, response, (error?: Error) => (error ? reject(error) : resolve()));
  });

/** Reads a JSON body in UTF-8, bounded; anything else is a 415, 400 or 413. */
export const jsonBody: RequestHandler = async (request, response, next) => {
  const { 'content-type': type = '', 'content-encoding': encoding = 'identity' } = request.headers;
  requireJson(type, encoding);
  await collect(request, response);
  request.body = read(request.body);
  next();
};
