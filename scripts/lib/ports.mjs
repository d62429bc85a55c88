import { createServer } from 'node:net';
import { Failure } from './failure.mjs';

/** The port a listener really got, or undefined where `port` is taken. 0 asks for any free one. */
const tryPort = (port, host) =>
  new Promise((resolve, reject) => {
    const server = createServer();
    server.on('error', (fault) =>
      fault.code === 'EADDRINUSE'
        ? resolve(undefined)
        : reject(new Failure(`Port ${port} of ${host} cannot be used: ${fault.message}`)),
    );
    server.listen({ port, host, exclusive: true }, () => {
      const got = server.address().port;
      server.close(() => resolve(got));
    });
  });

/** The usual port when it is free, else any that is. */
export const freePort = async (usual = 0, host = '127.0.0.1') =>
  (await tryPort(usual, host)) ?? tryPort(0, host);

/** Refuses a taken port by its number, and says what to set. */
export async function requireFreePort(port, host, variable = 'PORT') {
  if ((await tryPort(port, host)) !== undefined) return;
  throw new Failure(
    `Port ${port} of ${host} is taken by another program.\n` +
      `Set ${variable} to a free one, for example: ${variable}=${await freePort(0, host)} npm start`,
  );
}
