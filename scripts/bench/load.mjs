import http from 'node:http';

/**
 * Sends requests over `connections` kept-alive connections for `seconds`; returns requests a second
 * and the 50th and 99th percentile of latency. `next()` makes each request.
 */
export async function load(address, { connections = 16, seconds = 3, next }) {
  const { hostname, port } = new URL(address);
  const agent = new http.Agent({ keepAlive: true, maxSockets: connections });
  const latencies = [];
  const statuses = new Map();
  const end = performance.now() + seconds * 1000;

  const one = () =>
    new Promise((resolve, reject) => {
      const { method = 'GET', path, headers = {}, body } = next();
      const begun = performance.now();
      const request = http.request({ hostname, port, agent, method, path, headers }, (response) => {
        response.resume();
        response.once('end', () => {
          latencies.push(performance.now() - begun);
          statuses.set(response.statusCode, (statuses.get(response.statusCode) ?? 0) + 1);
          resolve();
        });
      });
      request.once('error', reject);
      request.end(body);
    });

  const begun = performance.now();
  await Promise.all(
    Array.from({ length: connections }, async () => {
      while (performance.now() < end) await one();
    }),
  );
  const took = (performance.now() - begun) / 1000;
  agent.destroy();
  latencies.sort((a, b) => a - b);
  const at = (share) =>
    latencies[Math.min(latencies.length - 1, Math.floor(share * latencies.length))];
  return { rate: latencies.length / took, p50: at(0.5), p99: at(0.99), statuses };
}

export const median = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];
