import { Socket } from 'node:net';
import { isMainThread } from 'node:worker_threads';

/**
 * Loaded into the server before anything else: when the command that started it is gone, even
 * killed without a chance to clean up, the pipe between them closes and the server shuts down
 * as it does on SIGTERM.
 */
if (isMainThread) {
  new Socket({ fd: 3, readable: true, writable: false })
    .on('close', () => process.kill(process.pid, 'SIGTERM'))
    .on('error', () => {})
    .resume()
    .unref();
}
