import { get } from 'node:http';

/** Whether an address of this machine answers 200 under a host name. */
export const answers = ({ host, port, path, name }) =>
  new Promise((resolve) => {
    const options = { host, port, path, headers: { host: name }, timeout: 2_000 };
    const request = get(options, (response) => {
      response.resume();
      resolve(response.statusCode === 200);
    });
    request.on('timeout', () => request.destroy()).on('error', () => resolve(false));
  });
