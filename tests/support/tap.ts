import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Express } from 'express';

export interface Tapped {
  address: string;
  /** All but the one header that carries the session to its browser. */
  headers: string;
  body: string;
}

/** The same server, with a copy of everything that it answers. */
export function tap(app: Express): { app: Express; answers: Tapped[] } {
  const answers: Tapped[] = [];
  const tapped = (req: IncomingMessage, res: ServerResponse) => {
    // Compressed answers could not be read.
    delete req.headers['accept-encoding'];
    const chunks: Buffer[] = [];
    const [write, end] = [res.write.bind(res), res.end.bind(res)] as [Pass, Pass];
    const keep = (chunk: unknown) => {
      if (typeof chunk === 'string' || Buffer.isBuffer(chunk)) chunks.push(Buffer.from(chunk));
    };
    res.write = ((...args: unknown[]) => {
      keep(args[0]);
      return write(...args);
    }) as ServerResponse['write'];
    res.end = ((...args: unknown[]) => {
      keep(args[0]);
      return end(...args);
    }) as ServerResponse['end'];
    res.on('finish', () => {
      const { 'set-cookie': _, ...headers } = res.getHeaders();
      answers.push({
        address: `${req.method} ${req.url}`,
        headers: JSON.stringify(headers),
        body: Buffer.concat(chunks).toString('latin1'),
      });
    });
    app(req, res);
  };
  return { app: tapped as unknown as Express, answers };
}

type Pass = (...args: unknown[]) => never;
