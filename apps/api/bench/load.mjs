// Puts a server under load and says what came of it.
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';

const autocannon = createRequire(import.meta.url)('autocannon');

export const quantile = (list, q) =>
  [...list].sort((a, b) => a - b)[Math.min(list.length - 1, Math.floor(list.length * q))];

const residentMb = (pid) =>
  Math.round(Number(/VmRSS:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))?.[1]) / 1024);

/**
 * Sends every request once, several at a time.
 * @param requests path and headers of each
 * @param pid of the server, whose memory is looked at all the while
 * @throws when any answer is not 200
 */
export function underLoad(url, requests, { pid }) {
  const connections = Math.min(8, requests.length);
  return new Promise((resolve, reject) => {
    const times = [];
    let mostMb = residentMb(pid);
    const watch = setInterval(() => (mostMb = Math.max(mostMb, residentMb(pid))), 100);
    let next = 0;
    const start = performance.now();
    let last = start;
    const run = autocannon(
      {
        url,
        connections,
        amount: requests.length,
        timeout: 60,
        // Each connection takes the requests of its own share, so that no two are the same.
        setupClient: (client) => {
          client.setRequests(requests.filter((_, i) => i % connections === next % connections));
          next += 1;
        },
      },
      (error, result) => {
        clearInterval(watch);
        if (error) reject(error);
        else if (result.non2xx + result.errors + result.timeouts > 0 || times.length !== requests.length)
          reject(new Error(`${result.non2xx} refused, ${result.errors} failed of ${requests.length}`));
        else resolve({ perSecond: times.length / ((last - start) / 1000), times, mostMb });
      },
    );
    run.on('response', (_client, _status, _bytes, ms) => {
      times.push(ms);
      last = performance.now();
    });
  });
}
