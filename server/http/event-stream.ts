import type { Request, Response } from 'express';

export type EventStream = {
  /** Sends one event; `data` is JSON. */
  send(data: unknown): void;
  close(): void;
};

const HEARTBEAT_MS = 15_000;

/**
 * Answers with server-sent events. The stream ends with the connection; `onEnd` is called once, whoever ended it.
 * Not compressed: a compressor would hold events back.
 */
export function openEventStream(req: Request, res: Response, onEnd: () => void): EventStream {
  let ended = false;
  const end = (): void => {
    if (ended) return;
    ended = true;
    clearInterval(heart);
    onEnd();
    res.end();
  };
  res.writeHead(200, {
    'Content-Type': 'text/event-stream; charset=utf-8',
    'Cache-Control': 'no-store, no-transform',
    // A proxy that gathers answers is told not to.
    'X-Accel-Buffering': 'no',
  });
  res.write('retry: 3000\n\n');
  const heart = setInterval(() => res.write(': still here\n\n'), HEARTBEAT_MS);
  heart.unref();
  res.on('close', end);
  req.on('aborted', end);
  return {
    send: (data) => {
      if (!ended) res.write(`data: ${JSON.stringify(data)}\n\n`);
    },
    close: end,
  };
}
