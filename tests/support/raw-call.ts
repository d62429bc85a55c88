import { connect } from 'node:net';

/**
 * Sends the bytes of a request as they are, which clients would put right, and answers all that
 * comes back until the connection is closed.
 */
export function rawCall(url: string, lines: readonly string[]): Promise<string> {
  const { hostname, port } = new URL(url);
  return new Promise((resolve, reject) => {
    let answer = '';
    connect(Number(port), hostname)
      .setEncoding('utf8')
      .on('data', (text: string) => (answer += text))
      .on('error', reject)
      .on('close', () => resolve(answer))
      .end([...lines, 'Connection: close', '', ''].join('\r\n'));
  });
}

/** Status of a raw answer. */
export const statusIn = (answer: string) => Number(/^HTTP\/1\.1 (\d{3})/.exec(answer)?.[1]);
