// Starts servers for a measurement, waits until they answer, and ends them.
import { spawn } from 'node:child_process';
import { createServer } from 'node:net';
import { fileURLToPath } from 'node:url';

export const fromHere = (path) => fileURLToPath(new URL(path, import.meta.url));

const freePort = () =>
  new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });

/** @throws when the server ends or does not answer within half a minute */
export async function startServer(file, readyPath, env, nodeArguments = []) {
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const server = spawn(process.execPath, [...nodeArguments, fromHere(file)], {
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
    env: { PATH: process.env.PATH, NODE_ENV: 'production', PORT: String(port), PUBLIC_URL: url, ...env },
  });
  const stop = () =>
    new Promise((resolve) => {
      if (server.exitCode !== null || server.signalCode !== null) return resolve();
      server.once('exit', resolve);
      server.kill('SIGTERM');
    });
  for (let tries = 0; tries < 300; tries += 1) {
    if (server.exitCode !== null) throw new Error(`${file} ended with ${server.exitCode}`);
    if ((await fetch(url + readyPath).catch(() => null))?.ok) return { url, pid: server.pid, server, stop };
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  await stop();
  throw new Error(`${file} did not become ready`);
}
