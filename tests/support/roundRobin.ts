import http from 'node:http';
import type { AddressInfo } from 'node:net';

export interface RoundRobin {
  base: string;
  /** How many requests each server got. */
  counts: number[];
  stop: () => Promise<void>;
}

/** A load balancer without sticky sessions: each request goes to the next server, whoever sends it. */
export async function startRoundRobin(servers: readonly { base: string }[]): Promise<RoundRobin> {
  const counts = servers.map(() => 0);
  let turn = 0;
  const proxy = http.createServer((req, res) => {
    const index = turn++ % servers.length;
    counts[index] = (counts[index] ?? 0) + 1;
    const target = new URL(req.url ?? '/', servers[index]?.base).href;
    const forwarded = { ...req.headers, 'x-forwarded-for': req.socket.remoteAddress };
    const out = http.request(target, { method: req.method, headers: forwarded }, (answer) => {
      res.writeHead(answer.statusCode ?? 502, answer.headers);
      answer.pipe(res);
    });
    out.on('error', () => (res.headersSent ? res.destroy() : res.writeHead(502).end()));
    req.pipe(out);
  });
  await new Promise<void>((resolve) => proxy.listen(0, '127.0.0.1', () => resolve()));
  return {
    base: `http://127.0.0.1:${(proxy.address() as AddressInfo).port}`,
    counts,
    stop: () =>
      new Promise((resolve) => {
        proxy.close(() => resolve());
        proxy.closeAllConnections();
      }),
  };
}
