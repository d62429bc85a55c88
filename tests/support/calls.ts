import request from 'supertest';
import type { TestServer } from './server';

export const phosphoric = { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] };

/** POST with the server's good key. */
export const postWithKey = ({ url, key }: TestServer, path: string) =>
  request(url).post(path).set('Authorization', `Bearer ${key}`);

/** The faults of a problem as `pointer code`. */
export const faultsIn = (body: { errors?: { pointer: string; code: string }[] }) =>
  (body.errors ?? []).map(({ pointer, code }) => `${pointer} ${code}`);
