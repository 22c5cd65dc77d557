import { createServer } from 'node:net';

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
    throw error;
  }
}

export const freePort = () => listenOnce(0, '127.0.0.1');
