import type { Response } from 'express';

const heartbeatMs = 15_000;
const longestBufferBytes = 1024 * 1024;

/** Server-sent events on an open answer: kept alive by comments, cut where the listener does not keep up. */
export function openEventStream(response: Response): { send: (event: string, data: unknown) => void; onClose: (act: () => void) => void } {
  response.status(200).set({ 'Content-Type': 'text/event-stream', 'Cache-Control': 'no-store', 'X-Accel-Buffering': 'no' });
  response.flushHeaders();
  response.write(': listening\n\nretry: 2000\n\n');
  const beat = setInterval(() => response.write(': still here\n\n'), heartbeatMs);
  response.on('close', () => clearInterval(beat));
  return {
    send: (event, data) => {
      if (response.writableLength > longestBufferBytes) response.destroy();
      else if (!response.writableEnded) response.write(`event: ${event}\ndata: ${JSON.stringify(data)}\n\n`);
    },
    onClose: (act) => void response.on('close', act),
  };
}
