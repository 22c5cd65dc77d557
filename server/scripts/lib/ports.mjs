import { createServer } from 'node:net';
import { Refusal } from './refusal.mjs';

function listenOnce(port, host) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(port, host, () => {
      const { port: got } = server.address();
      server.close(() => resolve(got));
    });
  });
}

export async function isPortFree(port, host = '127.0.0.1') {
  try {
    await listenOnce(port, host);
    return true;
  } catch (error) {
    if (error.code === 'EADDRINUSE') return false;
    if (error.code === 'EACCES')
      throw new Refusal(`Port ${port} may be opened by root only: choose one above 1023.`);
    throw error;
  }
}

export const freePort = () => listenOnce(0, '127.0.0.1');
