import request from 'supertest';
import { demoPassword } from '../../server/services/demo/demo-data';
import type { TestServer } from './server';

/** A person's browser: keeps the cookies and says where its requests come from. */
export type Signed = ReturnType<typeof request.agent>;

/** Signs a demo person in. */
export async function signedIn(server: TestServer, email: string): Promise<Signed> {
  const agent = request.agent(server.url).set('Origin', server.url);
  await agent.post('/v1/sessions').send({ email, password: demoPassword }).expect(201);
  return agent;
}
