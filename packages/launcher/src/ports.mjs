import { createServer } from 'node:net';

const tryPort = (port, host) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) => resolve({ error }));
    server.listen({ port, host, exclusive: true }, () => {
      const taken = server.address().port;
      server.close(() => resolve({ port: taken }));
    });
  });

/** True when nothing listens on this port, on loopback or on all addresses. */
export async function isFree(port) {
  for (const host of ['127.0.0.1', '::']) {
    const { error } = await tryPort(port, host);
    // A machine without IPv6 answers EAFNOSUPPORT or EADDRNOTAVAIL: that says nothing about the port.
    if (error && ['EADDRINUSE', 'EACCES'].includes(error.code)) return false;
  }
  return true;
}

/** A free loopback port: the preferred one when it is free, else one that the system chooses. */
export async function freePort(preferred) {
  if (preferred && (await isFree(preferred))) return preferred;
  const { port, error } = await tryPort(0, '127.0.0.1');
  if (error) throw error;
  return port;
}
