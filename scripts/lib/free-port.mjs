import { createServer } from 'node:net';

/** A port on loopback that nothing listens on just now. @returns {Promise<number>} */
export async function freePort() {
  const server = await listen(0);
  const { port } = server.address();
  await new Promise((resolve) => server.close(resolve));
  return port;
}

/** Whether one can listen on this loopback port. A port below 1024 without the right to it is not free either. */
export async function portIsFree(port) {
  try {
    const server = await listen(port);
    await new Promise((resolve) => server.close(resolve));
    return true;
  } catch {
    return false;
  }
}

function listen(port) {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => resolve(server));
  });
}
