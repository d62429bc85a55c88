import { once } from 'node:events';
import { createServer } from 'node:http';
import { freePort } from './ports.mjs';

const usualPort = 8025;

const written = ({ at, from, to, subject, text }) =>
  `${at}\nFrom: ${from}\nTo: ${to.join(', ')}\nSubject: ${subject}\n\n${text}`;

const plain = (messages) =>
  messages.length === 0 ? 'No mail yet.\n' : messages.map(written).join(`\n${'-'.repeat(72)}\n\n`);

/**
 * Shows the messages, newest first, as text or by `Accept: application/json`; on the loopback
 * address, and only to whoever asks for it by that name: a page from elsewhere whose name was
 * pointed here must not read them.
 */
export async function openMailPage(messages) {
  const port = await freePort(usualPort);
  const hosts = new Set([`localhost:${port}`, `127.0.0.1:${port}`]);
  const server = createServer((request, response) => {
    const isOurs = hosts.has(request.headers.host) && request.url === '/';
    const isRead = request.method === 'GET' || request.method === 'HEAD';
    const asJson = request.headers.accept === 'application/json';
    const newest = [...messages].reverse();
    response.writeHead(isOurs && isRead ? 200 : 404, {
      'Content-Type': `${asJson ? 'application/json' : 'text/plain'}; charset=utf-8`,
      'Cache-Control': 'no-store',
      'Cross-Origin-Resource-Policy': 'same-origin',
      'X-Content-Type-Options': 'nosniff',
    });
    response.end(isOurs && isRead ? (asJson ? JSON.stringify(newest) : plain(newest)) : '');
  });
  await once(server.listen(port, '127.0.0.1'), 'listening');
  return {
    url: `http://localhost:${port}`,
    close: () => {
      server.closeAllConnections();
      return new Promise((resolve) => server.close(resolve));
    },
  };
}
