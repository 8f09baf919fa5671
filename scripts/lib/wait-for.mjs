import { connect } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';

/**
 * Waits until an address answers with a status below 400.
 * @param {string} url
 * @param {{timeoutMs?: number, giveUp?: () => Error | null}} [options] `giveUp` ends the wait early with its error
 */
export async function waitFor(url, { timeoutMs = 60_000, giveUp = () => null } = {}) {
  let last = 'no answer';
  await until(async () => {
    const failure = giveUp();
    if (failure) throw failure;
    try {
      const reply = await fetch(url, { signal: AbortSignal.timeout(5_000) });
      last = `status ${reply.status}`;
      await reply.body?.cancel();
      return reply.status < 400;
    } catch (error) {
      last = error.cause?.code ?? error.message;
      return false;
    }
  }, timeoutMs).catch((error) => {
    throw error instanceof TimeUp ? new Error(`${url} did not become ready: ${last}.`) : error;
  });
}

class TimeUp extends Error {}

/** Asks again every 100 ms until the answer is true; an error of `ask` ends it. */
export async function until(ask, timeoutMs) {
  const end = Date.now() + timeoutMs;
  while (!(await ask())) {
    if (Date.now() > end) throw new TimeUp(`Gave up after ${Math.round(timeoutMs / 1000)} s.`);
    await sleep(100);
  }
}

/** Waits until something accepts connections on a loopback port. */
export async function waitForPort(port, { timeoutMs = 30_000, giveUp = () => null } = {}) {
  await until(async () => {
    const failure = giveUp();
    if (failure) throw failure;
    return connects(port);
  }, timeoutMs);
}

function connects(port) {
  return new Promise((resolve) => {
    const socket = connect({ port, host: '127.0.0.1' });
    const answer = (open) => {
      socket.destroy();
      resolve(open);
    };
    socket.once('connect', () => answer(true));
    socket.once('error', () => answer(false));
  });
}
